import { InvalidArgumentError, Option } from '@commander-js/extra-typings';
import { type Pairs, collectPairs, given } from './options.ts';

type Fields = Readonly<Record<string, unknown>>;

export const cellsOption = new Option(
  '--cells <N>',
  'of a stack: cells in series that the current works in: --cells 24',
);
export const bypassOption = new Option(
  '--bypass <PART>',
  'of a stack: the part of the current that misses the electrodes: --bypass "2 %"',
);
export const budgetOption = new Option('--budget', 'what each input contributes to each uncertainty');
export const tankOption = new Option('--tank', 'the acid, base and water that the tank gains or loses');

/** "current,time=0.5" as a correlation of an ask. */
const correlation = (typed: string, before: readonly Fields[] = []): readonly Fields[] => {
  const [, one, other, coefficient] = /^([^,=]+),([^,=]+)=(.*)$/s.exec(typed) ?? [];
  if (one === undefined || other === undefined || coefficient === undefined)
    throw new InvalidArgumentError('Write INPUT,INPUT=COEFFICIENT.');
  return [...before, { between: [one.trim(), other.trim()], coefficient: coefficient.trim() }];
};

export const correlationOption = new Option(
  '--correlation <A,B=R>',
  'two inputs that are not independent: --correlation current,time=0.5; repeatable',
).argParser<readonly Fields[]>(correlation);

export const seriesOption = new Option(
  '--series <CELL>',
  'a further cell of the same circuit, "SPECIES: HALF", with what was measured in it behind semicolons: ' +
    '--series "Ag: Ag^+ + e^- -> Ag; mass=4.025 g"; repeatable',
).argParser<readonly Fields[]>(seriesCells);

/** "Ag: Ag^+ + e^- -> Ag; mass=4.025 g": species, half-reaction, what is given. Throws where it has no such form. */
const seriesCell = (typed: string): Fields => {
  const [cell = '', ...measured] = typed.split(';');
  const [, species, half] = /^([^:]*\S)\s*:\s*(\S.*)$/s.exec(cell.trim()) ?? [];
  if (species === undefined || half === undefined)
    throw new InvalidArgumentError('Write SPECIES: HALF, such as "Ag: Ag^+ -> Ag".');
  const pairs = measured
    .filter((one) => one.trim() !== '')
    .reduce<Pairs>((all, one) => collectPairs(one.trim(), all), {});
  return { species: species.trim(), half: half.trim(), ...(Object.keys(pairs).length === 0 ? {} : { given: pairs }) };
};

/** Collects the cells in series. */
function seriesCells(typed: string, before: readonly Fields[] = []): readonly Fields[] {
  return [...before, seriesCell(typed)];
}

/** What the options of stacks, budgets, tanks and series say. */
export interface AmountsOptions {
  readonly cells?: string | undefined;
  readonly bypass?: string | undefined;
  readonly budget?: true | undefined;
  readonly tank?: true | undefined;
  readonly correlation?: readonly Fields[] | undefined;
  readonly series?: readonly Fields[] | undefined;
}

/** The fields of an ask of amounts that these options fill. */
export const amountsFields = ({
  cells,
  bypass,
  budget,
  tank,
  correlation: correlations,
  series,
}: AmountsOptions): Fields => given({ cells, bypass, budget, tank, correlations, series });
