import type { WholeTank } from '../../desk/sheet/answer.ts';
import { standsOut } from './table.ts';
import { type Writing, efficiencyText, four, fourUnits } from './words.ts';

/** A tank in one row. */
export interface TankSummary {
  readonly product: string;
  /** Mass of the product over all runs; "" where none follows. */
  readonly made: string;
  readonly charge: string;
  readonly efficiency: string;
  /** What someone has to look at: a weighing that stands out, a goal that is missed, a part at fault. */
  readonly alarms: readonly string[];
}

/** By weighing where runs were weighed, else the share that the runs state. */
const efficiencyOf = ({ weighed, currentUse, product }: WholeTank): string => {
  if (weighed !== null) return efficiencyText(weighed);
  const { measured } = currentUse;
  if (measured === null) return '';
  const share = currentUse[measured].find(({ species }) => species === product.replace(/\([a-z]+\)$/, ''))?.share;
  return share === undefined ? '' : `${four({ value: share * 100, unit: '%' })} %`;
};

/** Faults that are named one by one. */
const MOST_NAMED = 2;

const alarmsOf = (tank: WholeTank, write: Writing): readonly string[] => {
  const out = tank.runs.flatMap((run) => ('fault' in run || standsOut(run) === null ? [] : [run.name]));
  const missed = tank.targets.flatMap((target) => ('fault' in target || target.reached !== false ? [] : [target.name]));
  const broken = [...tank.runs, ...tank.targets].flatMap((part) => ('fault' in part ? [part.name] : []));
  return [
    ...out.map((name) => `${write.text(name)} stands out`),
    ...missed.map((name) => `${write.text(name)} is missed`),
    ...(broken.length > MOST_NAMED
      ? [`${String(broken.length)} parts were not answered`]
      : broken.map((name) => `${write.text(name)} was not answered`)),
  ];
};

/** What a tank made, and what needs a look. */
export const tankSummary = (tank: WholeTank, write: Writing): TankSummary => {
  const total = tank.totals.products.find(({ species }) => species === tank.product.replace(/\([a-z]+\)$/, ''));
  return {
    product: write.species(tank.product),
    made: total?.mass === undefined ? '' : fourUnits(total.mass),
    charge: tank.totals.runs === 0 ? '' : fourUnits(tank.totals.charge),
    efficiency: efficiencyOf(tank),
    alarms: alarmsOf(tank, write),
  };
};
