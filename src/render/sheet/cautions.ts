import type { SheetAnswer, SheetCaution } from '../../desk/sheet/answer.ts';

/** What comes before everything else, in every format. */
export const graveOf = ({ cautions }: SheetAnswer): readonly SheetCaution[] =>
  cautions.filter(({ grave }) => grave === true);

/** The rest, for the end of the page. */
export const othersOf = ({ cautions }: SheetAnswer): readonly SheetCaution[] =>
  cautions.filter(({ grave }) => grave !== true);

/** True where a tank makes gas at a known rate: then the page says how the rates were found. */
export const makesGas = ({ tanks }: SheetAnswer): boolean =>
  tanks.some((tank) => !('fault' in tank) && tank.gas.length > 0);
