import { Command, Option, type CommandUnknownOpts } from '@commander-js/extra-typings';
import {
  amountsFields,
  budgetOption,
  bypassOption,
  cellsOption,
  correlationOption,
  seriesOption,
  tankOption,
} from './amounts-option.ts';
import {
  anodeMediumOption,
  anodeOption,
  cathodeMediumOption,
  cathodeOption,
  cellFields,
  diagramOption,
  missingOfCell,
  reactionFields,
  separatorOption,
} from './electrode-option.ts';
import {
  type Pairs,
  balancingFields,
  collect,
  collectPairs,
  commonFields,
  defineOption,
  foldOption,
  given,
  helpersOption,
  jsonOption,
  mediumOption,
  plainOption,
  requestFields,
  settleOption,
  strictOption,
  whereOption,
} from './options.ts';
import { type Shell, examples } from './shell.ts';

const halfOption = new Option(
  '--half <REACTION>',
  'a half-reaction; several run in parallel, each with " @ 95 %" behind it for its share; repeatable',
).argParser<readonly string[]>(collect);
const speciesOption = new Option('--species <SPECIES>', 'whose amounts are asked: --species Cu').makeOptionMandatory();
const givenOption = new Option(
  '--given <QUANTITY=VALUE>',
  'what is known: --given current="2 A" --given time="1 h 30 min", efficiency, mass, volume ...; repeatable',
).argParser<Pairs>(collectPairs);
const wantOption = new Option(
  '--want <QUANTITY=UNIT>',
  'the unit to answer in: --want mass=kg; repeatable',
).argParser<Pairs>(collectPairs);

/** Every quantity by its name, as --given and --want take it. */
const QUANTITY_HELP = `
Quantities of --given and --want:
  charge, current, current_density, area, time, efficiency, share, blank,
  amount, mass, volume (of gas; of the tank beside from and to), temperature,
  pressure, vapour_pressure, density, thickness, from, to (concentrations),
  voltage, energy, mass_per_charge, charge_per_mass, energy_per_mass
  A standard uncertainty is written behind: "2.000(4) A", "2.000 A ± 0.004 A".`;

interface ReactionOptions {
  readonly half?: readonly string[] | undefined;
}

/** One half without a share is a half-reaction; several, or one with a share, are an electrode. */
const electrodeFields = ({ half = [] }: ReactionOptions): Readonly<Record<string, unknown>> => {
  const reactions = half.map((typed) => reactionFields(typed, 'half'));
  const [only] = reactions;
  return reactions.length === 1 && only?.['share'] === undefined ? { half: only?.['half'] } : { electrode: reactions };
};

/** `amounts`: from charge, current, time or weight to everything that follows. */
export const amountsCommand = (shell: Shell): CommandUnknownOpts => {
  const command = new Command('amounts')
    .description('charge, time, mass, gas and energy of a half-reaction, an electrode or a cell')
    .addOption(halfOption)
    .addOption(anodeOption)
    .addOption(cathodeOption)
    .addOption(speciesOption)
    .addOption(givenOption)
    .addOption(wantOption)
    .addOption(mediumOption)
    .addOption(helpersOption)
    .addOption(anodeMediumOption)
    .addOption(cathodeMediumOption)
    .addOption(separatorOption)
    .addOption(diagramOption)
    .addOption(settleOption)
    .addOption(cellsOption)
    .addOption(bypassOption)
    .addOption(seriesOption)
    .addOption(tankOption)
    .addOption(budgetOption)
    .addOption(correlationOption)
    .addOption(foldOption)
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText('after', QUANTITY_HELP)
    .addHelpText(
      'after',
      examples(
        'couplet amounts --half "Cu^2+ + 2 e^- -> Cu" --species Cu --given current="250 A" --given time="6 h" --given efficiency="94 %" --want mass=kg',
        'couplet amounts --half "Zn^2+ -> Zn @ 90 %" --half "H^+ -> H2" --species Zn --given charge="1 kA h"',
        'couplet amounts --anode "H2O -> O2(g)" --cathode "Cu^2+ -> Cu" --species O2 --given current="2 A" --given time="1 h" --given temperature="25 °C" --given pressure="1 bar"',
        'couplet amounts --anode "H2O -> O2" --cathode "Cu^2+ -> Cu" --species Cu --given charge="1 kA h" --tank',
        'couplet amounts --half "Cl^- -> Cl2" --species Cl2 --given charge="1 kA h" --cells 24 --bypass "2 %"',
        'couplet amounts --half "Cu^2+ -> Cu" --species Cu --given current="2.00(2) A" --given time="1 h ± 5 s" --budget --correlation current,time=0.5',
        'couplet amounts --half "Cu^2+ -> Cu" --species Cu --series "Ag: Ag^+ -> Ag; mass=4.025 g"',
      ),
    );
  return command.action((options) => {
    const { species, want } = options;
    const isCell = options.anode !== undefined || options.cathode !== undefined || options.diagram !== undefined;
    if (!isCell && options.half === undefined) command.error('Give --half, or --anode and --cathode, or --diagram.');
    if (isCell && options.half !== undefined) command.error('Give --half, or a cell, not both.');
    const missing = isCell ? missingOfCell(options) : null;
    if (missing !== null) command.error(missing);
    const { medium, settle } = balancingFields(options);
    const cell = isCell ? { cell: cellFields(options) } : electrodeFields(options);
    const fields = given({ ...cell, species, given: options.given ?? {}, want, medium, settle });
    const more = { ...amountsFields(options), ...requestFields(options), ...commonFields(options) };
    return shell.ask({ ask: 'amounts', ...fields, ...more }, options);
  });
};
