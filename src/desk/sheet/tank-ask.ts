import type { SheetHead, SheetTank } from '../schema/sheet.ts';

/** What holds for every ask of a sheet. */
export const commonOf = ({ where, define }: Pick<SheetHead, 'where' | 'define'>): object => ({
  ...(where === undefined ? {} : { where }),
  ...(define === undefined ? {} : { define }),
});

/** The cell of a tank as an ask gives it. */
export const cellOf = ({ anode, cathode, medium, separator }: SheetTank): object => ({
  anode,
  cathode,
  ...(medium === undefined ? {} : { medium }),
  ...(separator === undefined ? {} : { separator: separator === 'true' || separator === 'yes' }),
});

/** The units in which a sheet answers: those of a works, not of a bench. */
const WANTED = { charge: 'A h', mass: 'kg' } as const;

/** What the cell of a tank makes of what is given, as an ask of the contract. */
export const tankAsk = (head: SheetHead, tank: SheetTank, species: string, given: object): object => ({
  ask: 'amounts',
  cell: cellOf(tank),
  species,
  given,
  want: WANTED,
  ...commonOf(head),
});
