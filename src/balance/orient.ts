import type { Unknown } from './unknowns.ts';

const wants = (unknown: Unknown, value: bigint): boolean =>
  unknown.side === 'free' || value === 0n || (unknown.side === 'left') === value < 0n;

/** The strict unknowns that `numbers` put on the wrong side. */
const wrongOnes = (unknowns: readonly Unknown[], numbers: readonly bigint[]): readonly number[] =>
  unknowns.flatMap((unknown, index) => (wants(unknown, numbers[index] ?? 0n) ? [] : [index]));

/**
 * `line` or its opposite: the one that puts fewer species on the wrong side, those that are neither helper nor electron
 * counted first; a tie goes to the first species that takes part, which keeps the side where it stands first.
 */
export const orient = (unknowns: readonly Unknown[], line: readonly bigint[]): readonly bigint[] => {
  const opposite = line.map((value) => -value);
  const core = (index: number): boolean => unknowns[index]?.helper === false && unknowns[index].species.key !== 'e^-';
  const score = (numbers: readonly bigint[]): readonly [number, number, number] => {
    const wrong = wrongOnes(unknowns, numbers);
    return [wrong.filter(core).length, wrong.length, startsRight(unknowns, numbers) ? 0 : 1];
  };
  const [a, b] = [score(line), score(opposite)];
  const difference = a.map((value, at) => value - (b[at] ?? 0)).find((value) => value !== 0) ?? 0;
  return difference <= 0 ? line : opposite;
};

/** The first unknown that takes part stands right where it is written on the right only, else left. */
const startsRight = (unknowns: readonly Unknown[], numbers: readonly bigint[]): boolean => {
  const first = numbers.findIndex((value) => value !== 0n);
  return (unknowns[first]?.side === 'right') === (numbers[first] ?? 0n) > 0n;
};

/** The species that stands on the wrong side: one that is neither helper nor electron before others. */
export const wrongSided = (unknowns: readonly Unknown[], numbers: readonly bigint[]): number | undefined => {
  const wrong = wrongOnes(unknowns, numbers);
  return wrong.find((index) => unknowns[index]?.helper === false) ?? wrong[0];
};
