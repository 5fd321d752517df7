import type { TankBalanceShown } from '../desk/schema/answer.ts';
import type { Quantity } from '../desk/schema/shape.ts';
import { labelled } from './block.ts';
import { figureOf, uncertaintyOf } from './figure.ts';
import type { Look } from './look.ts';
import { numberText, speciesText } from './spelling.ts';

/** "+1.86532 mol" or "-0.5 mol": what is gained has its sign. */
const gained = (quantity: Quantity, look: Look): string => {
  const sign = quantity.value > 0 ? '+' : '';
  return [`${sign}${numberText(figureOf(quantity), look)}`, uncertaintyOf(quantity), quantity.unit]
    .filter((word) => word !== '')
    .join(' ');
};

/** What the tank gains and loses; says so where nothing changes. Nothing where it was not asked for. */
export const tankLines = (tank: TankBalanceShown | undefined, look: Look): readonly string[] => {
  if (tank === undefined) return [];
  const { acid, base, water } = tank;
  const rows: readonly string[] = [
    ...(acid === undefined ? [] : [`${gained(acid, look)} of ${speciesText('H^+', look)}`]),
    ...(base === undefined ? [] : [`${gained(base, look)} of ${speciesText('OH^-', look)}`]),
    ...(water === undefined
      ? []
      : [
          `${gained(water.amount, look)} of water`,
          `that is ${gained(water.mass, look)}, ${gained(water.volume, look)} at 25 °C`,
        ]),
  ];
  const shown = rows.length === 0 ? ['no acid, base or water is made or used up'] : rows;
  return labelled(
    shown.map((row, at) => [at === 0 ? 'tank' : '', row] as const),
    look,
  );
};
