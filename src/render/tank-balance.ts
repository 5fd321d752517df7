import type { TankBalanceShown } from '../desk/schema/answer.ts';
import type { Quantity } from '../desk/schema/shape.ts';
import { labelled } from './block.ts';
import { figureOf, uncertaintyOf } from './figure.ts';
import type { Look } from './look.ts';
import { speciesText } from './spelling.ts';

/** "+1.86532 mol" or "-0.5 mol": what is gained has its sign. */
const gained = (quantity: Quantity): string => {
  const sign = quantity.value > 0 ? '+' : '';
  return [`${sign}${figureOf(quantity)}`, uncertaintyOf(quantity), quantity.unit]
    .filter((word) => word !== '')
    .join(' ');
};

/** What the tank gains and loses; says so where nothing changes. Nothing where it was not asked for. */
export const tankLines = (tank: TankBalanceShown | undefined, look: Look): readonly string[] => {
  if (tank === undefined) return [];
  const { acid, base, water } = tank;
  const rows: readonly string[] = [
    ...(acid === undefined ? [] : [`${gained(acid)} of ${speciesText('H^+', look)}`]),
    ...(base === undefined ? [] : [`${gained(base)} of ${speciesText('OH^-', look)}`]),
    ...(water === undefined
      ? []
      : [`${gained(water.amount)} of water: ${gained(water.mass)}, ${gained(water.volume)} at 25 °C`]),
  ];
  const shown = rows.length === 0 ? ['no acid, base or water is made or used up'] : rows;
  return labelled(
    shown.map((row, at) => [at === 0 ? 'tank' : '', row] as const),
    look,
  );
};
