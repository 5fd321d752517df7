import type { ShownScaledHalf } from '../schema/shape.ts';
import type { CellReply, CurrentPart, CurrentUse, WholeRun } from './answer.ts';
import { productOfHalf } from './products.ts';

const numberOf = (exact: string): number => {
  const [numerator = '0', denominator = '1'] = exact.split('/');
  return Number(numerator) / Number(denominator);
};

const electronsOf = ({ multiplier = '1', electrons }: ShownScaledHalf): number =>
  numberOf(multiplier) * numberOf(electrons);

/** Shares as the cell reaction has them: multiplier times electrons over the sum of the electrode. */
const written = (halves: readonly ShownScaledHalf[]): readonly CurrentPart[] => {
  const total = halves.reduce((sum, half) => sum + electronsOf(half), 0);
  return halves.map((half) => ({ species: productOfHalf(half.reaction), share: electronsOf(half) / total }));
};

/** The efficiencies of the runs, weighted by their charge; undefined where no run states or finds one. */
const meanEfficiency = (runs: readonly WholeRun[], product: string): number | undefined => {
  let charge = 0;
  let used = 0;
  for (const run of runs) {
    const { charge: through, efficiency } = run.amounts.answer.quantities;
    if (run.product !== product || through === undefined || efficiency === undefined) continue;
    charge += Math.abs(through.value);
    used += (Math.abs(through.value) * efficiency.value) / 100;
  }
  return charge > 0 ? used / charge : undefined;
};

const TINY = 1e-9;

/** The product takes its efficiency; what is left of its own share goes where the sheet does not say. */
const corrected = (parts: readonly CurrentPart[], species: string, efficiency: number): readonly CurrentPart[] => {
  const changed = parts.map((part) => (part.species === species ? { ...part, share: efficiency } : part));
  const rest = 1 - changed.reduce((sum, { share }) => sum + share, 0);
  return rest > TINY ? [...changed, { species: null, share: rest }] : changed;
};

const bare = (product: string): string => product.replace(/\([a-z]+\)$/, '');

/** Where the current of a tank went, over all its runs: as the reactions share it, the product by its efficiency. */
export const currentUseOf = ({ answer: cell }: CellReply, product: string, runs: readonly WholeRun[]): CurrentUse => {
  const anode = written(cell.anode);
  const cathode = written(cell.cathode);
  const efficiency = meanEfficiency(runs, product);
  const species = bare(product);
  const at = (parts: readonly CurrentPart[]): boolean => parts.some((part) => part.species === species);
  if (efficiency === undefined) return { anode, cathode, measured: null };
  if (at(cathode)) return { anode, cathode: corrected(cathode, species, efficiency), measured: 'cathode' };
  if (at(anode)) return { anode: corrected(anode, species, efficiency), cathode, measured: 'anode' };
  return { anode, cathode, measured: null };
};
