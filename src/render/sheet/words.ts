import type { Quantity } from '../../desk/schema/shape.ts';
import type { Efficiency, GasRate, RecordedRun, Totals, WeighedTank, WholeTarget } from '../../desk/sheet/answer.ts';
import { figureOf, quantityText } from '../figure.ts';

/** How a page writes what it is given: every name of the sheet goes through `text`, every species through `species`. */
export interface Writing {
  readonly text: (raw: string) => string;
  readonly species: (plain: string) => string;
  /** What is doubtful or missed. */
  readonly alarm: (written: string) => string;
}

/** A number to four significant digits. */
export const four = ({ value, unit }: Quantity): string => figureOf({ value: Number(value.toPrecision(4)), unit });

/** A quantity to four significant digits with its unit. */
export const fourUnits = (quantity: Quantity): string => `${four(quantity)} ${quantity.unit}`;

/** A time in h as people say it: "27.5 min", "6 h 50 min"; rounded to the minute, below 100 minutes to a tenth. */
export const durationText = (hours: number): string => {
  const exact = Math.abs(hours) * 60;
  if (exact < 100) return `${String(Number(exact.toFixed(1)))} min`;
  const minutes = Math.round(exact);
  const [whole, rest] = [Math.floor(minutes / 60), minutes % 60];
  return rest === 0 ? `${String(whole)} h` : `${String(whole)} h ${String(rest)} min`;
};

const goalWords = (target: WholeTarget, write: Writing): string => {
  const named = target.goal.quantity === 'thickness' || target.goal.quantity === 'mass' ? ' of ' : ' with ';
  const start = target.start === null ? '' : ` from ${write.text(target.start)}`;
  const by = target.by === null ? '' : ` by ${write.text(target.by)}`;
  return `${write.text(target.goal.text)}${named}${write.species(target.species)}${start}${by}`;
};

const neededWords = ({ needed, current }: WholeTarget, write: Writing): readonly string[] => {
  if (needed === null) return [];
  const at = current === null ? '' : ` at ${write.text(fourUnits(current))}`;
  return [`needs ${durationText(needed.value)}${at}`];
};

const endWords = ({ ready, latest, reached, spare }: WholeTarget, write: Writing): readonly string[] => {
  const done = ready === null ? [] : [`ready at ${write.text(ready)}`];
  const start = latest === null ? [] : [`start at ${write.text(latest)} at the latest`];
  if (reached === null || spare === null) return [...done, ...start];
  const rest = durationText(spare.value);
  return [...done, reached ? `reached with ${rest} to spare` : write.alarm(`missed by ${rest}`)];
};

/** A goal and what it takes, in one sentence. */
export const targetSentence = (target: WholeTarget, write: Writing): string => {
  const enough = target.enough === null ? [] : [`${write.text(fourUnits(target.enough))} would just do`];
  const assumed = target.assumed ? ' An efficiency of 100 % was taken: none is stated.' : '';
  const parts = [...neededWords(target, write), ...endWords(target, write), ...enough];
  return `${goalWords(target, write)}: ${parts.join(', ')}.${assumed}`;
};

const percent = (part: number): string => `${String(Math.round(part * 100))} %`;

/** "weighed 71 %, current 28 %": parts of the variance; what is below half a percent is left out. */
export const budgetWords = ({ budget }: Efficiency, write: Writing): string =>
  budget
    .filter(({ part }) => part >= 0.005)
    .map(({ input, part }) => `${write.text(input.replaceAll('_', ' '))} ${percent(part)}`)
    .join(', ');

/** "93.12 ± 0.21 %". */
export const efficiencyText = ({ efficiency }: Efficiency): string =>
  efficiency.uncertainty === undefined ? `${four(efficiency)} %` : quantityText(efficiency);

/** The efficiency of a tank by its weighed runs, with what its uncertainty is made of. */
export const weighedSentence = (weighed: WeighedTank, write: Writing): string => {
  const runs = weighed.runs === 1 ? 'one weighed run' : `${String(weighed.runs)} weighed runs`;
  const budget = budgetWords(weighed, write);
  const made = budget === '' ? '; no uncertainty is stated' : `; its uncertainty comes from ${budget}`;
  const { without } = weighed;
  const rest = without === null ? '' : ` (${efficiencyText(without)} without what stands out)`;
  return `${write.text(efficiencyText(weighed))} by ${runs}${rest}${made}.`;
};

/** A gas rate and the air for it. */
export const gasSentence = ({ species, run, rate, air }: GasRate, write: Writing): string => {
  const made = `up to ${two(rate)} of ${write.species(species)} (${write.text(run)})`;
  return air === null ? made : `${made}, which takes about ${two(air)} of fresh air to stay below 1 % by volume`;
};

const two = ({ value, unit }: Quantity): string =>
  `${figureOf({ value: Number(value.toPrecision(2)), unit })} ${unit.replace('^3', '³')}`;

/** Said once under gas rates. */
export const GAS_BASIS =
  'Gas dry at 25 °C and 101.325 kPa; 1 % is a quarter of the lower flammable limit of hydrogen (4 %, ISO 10156). An estimate: local codes decide.';

/** What a record held. */
export const recordSentence = ({ path, rows, time, reversed }: RecordedRun, write: Writing): string => {
  const many = String(rows).replace(/\B(?=(\d{3})+$)/g, rows < 10_000 ? '' : ' ');
  const both =
    reversed === undefined ? '' : `, ${fourUnits(reversed.forward)} forward and ${fourUnits(reversed.reverse)} back`;
  return `${many} rows of ${write.text(path)} over ${durationText(time.value)}${both}`;
};

/** A sum with its name; `aside` says what it leaves out. */
export interface TotalRow {
  readonly name: string;
  readonly value: string;
  readonly aside: string;
}

/** Charge, energy and products of a sum. */
export const totalRows = (totals: Totals, write: Writing): readonly TotalRow[] => {
  const energy =
    totals.energy === null ? [] : [{ name: 'energy', value: fourUnits(totals.energy), aside: withoutVoltage(totals) }];
  const products = totals.products.flatMap(({ species, mass, volume }) => {
    const both = [mass, volume].flatMap((one) => (one === undefined ? [] : [fourUnits(one)]));
    return both.length === 0 ? [] : [{ name: write.species(species), value: both.join(', '), aside: '' }];
  });
  return [{ name: 'charge', value: fourUnits(totals.charge), aside: '' }, ...energy, ...products];
};

const withoutVoltage = ({ withoutVoltage: count }: Totals): string => {
  if (count === 0) return '';
  return count === 1 ? 'one run states no voltage' : `${String(count)} runs state no voltage`;
};
