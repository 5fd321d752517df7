import type { AmountsAnswerShown, CellAnswer } from '../schema/answer.ts';
import type { Quantity } from '../schema/shape.ts';

/** What the medium lends is made and used everywhere; nobody runs a tank for it. */
const LENT = new Set(['H2O', 'H^+', 'OH^-', 'e^-']);

/** What the cell makes, the tank's product first; what a medium lends is left out unless the tank is run for it. */
export const productsOf = (overall: CellAnswer['overall'], product: string): readonly string[] => {
  const made = overall.terms.filter((term) => !term.nu.startsWith('-')).map((term) => term.species);
  const first = made.filter((species) => species === product || product.startsWith(`${species}(`));
  return [...new Set([...first, ...made.filter((species) => !LENT.has(species))])];
};

/** The first product of a half-reaction that its medium does not lend; else any product. */
export const productOfHalf = ({ terms }: CellAnswer['overall']): string => {
  const made = terms.filter((term) => !term.nu.startsWith('-') && term.species !== 'e^-');
  return (made.find((term) => !LENT.has(term.species)) ?? made[0])?.species ?? '';
};

/** The quantities of one species, whether it is the one asked or stands alongside. */
export const quantitiesOf = (amounts: AmountsAnswerShown, species: string): Readonly<Record<string, Quantity>> => {
  const beside = amounts.alongside[species];
  if (beside !== undefined) return beside;
  return species in amounts.electronsPerMole ? amounts.quantities : {};
};
