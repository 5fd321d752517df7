import { Command, type CommandUnknownOpts } from '@commander-js/extra-typings';
import {
  anodeMediumOption,
  anodeOption,
  cathodeMediumOption,
  cathodeOption,
  cellFields,
  diagramOption,
  missingOfCell,
  separatorOption,
} from './electrode-option.ts';
import {
  balancingFields,
  commonFields,
  defineOption,
  foldOption,
  helpersOption,
  jsonOption,
  mediumOption,
  perOption,
  plainOption,
  requestFields,
  settleOption,
  strictOption,
  styleOption,
  whereOption,
} from './options.ts';
import { type Shell, examples } from './shell.ts';

/** `cell`: two electrodes, or a diagram, to the overall reaction and its electron number. */
export const cellCommand = (shell: Shell): CommandUnknownOpts => {
  const command = new Command('cell')
    .description('compose the overall reaction of a cell and its electron number')
    .addOption(anodeOption)
    .addOption(cathodeOption)
    .addOption(mediumOption)
    .addOption(helpersOption)
    .addOption(anodeMediumOption)
    .addOption(cathodeMediumOption)
    .addOption(separatorOption)
    .addOption(diagramOption)
    .addOption(settleOption)
    .addOption(perOption)
    .addOption(foldOption)
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(styleOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet cell --anode "H2O -> O2" --cathode "Cu^2+ -> Cu" --medium acid',
        'couplet cell --anode "OH^- -> O2" --cathode "Zn(OH)4^2- -> Zn @ 92 %" --cathode "H2O -> H2 @ 8 %" --medium base',
        'couplet cell --anode "Cl^- -> Cl2" --cathode "H2O -> H2" --cathode-medium base --separator',
        'couplet cell --diagram "Zn | Zn^2+ || Cu^2+ | Cu"',
        'couplet cell --anode "H2O -> O2" --cathode "Cu^2+ -> Cu" --per "Cu" --style html',
      ),
    );
  return command.action((options) => {
    const missing = missingOfCell(options);
    if (missing !== null) command.error(missing);
    return shell.ask(
      {
        ask: 'cell',
        ...cellFields(options),
        ...balancingFields(options),
        ...requestFields(options),
        ...commonFields(options),
      },
      options,
    );
  });
};
