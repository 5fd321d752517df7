import { type Electrodes, composeCell } from '../cell/compose.ts';
import type { CellReaction, Electrode, ElectrodeReaction as Placed } from '../cell/cell-reaction.ts';
import { electrodesOfDiagram } from '../cell/diagram.ts';
import type { MediumChoice } from '../redox/choose-medium.ts';
import type { HalfReaction } from '../redox/half-reaction.ts';
import { completeHalf } from '../redox/half.ts';
import { needless } from '../redox/coupling/needless.ts';
import { type RedoxReaction, balanceRedox } from '../redox/redox.ts';
import { type Meter, startMeter } from '../exact/bounds.ts';
import type { Rational } from '../exact/rational.ts';
import { type Result, chain, failure, inField, map, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { readDiagram } from '../species/diagram.ts';
import { type DeskOptions, readSketch } from './hydronium.ts';
import { allByRank } from '../report/precedence.ts';
import type { AskedMedium, CellFields } from './schema/ask.ts';
import { readMedium, readShare } from './settings.ts';

/** A cell of two electrodes as an ask gives it. */
export type ComposedFields = Extract<CellFields, { readonly anode: unknown }>;

/** One skeleton of an ask with all that holds for it, and the fields where its parts stand. */
export interface SkeletonFields {
  readonly text: string;
  readonly medium: AskedMedium | undefined;
  readonly settle: string | undefined;
  /** `settle` is said of several skeletons at once. */
  readonly sharedSettle?: boolean;
  readonly share?: string | undefined;
  readonly field: string;
  readonly mediumField: string;
}

/** A skeleton that has been read and waits to be balanced. */
export interface ReadSkeleton {
  readonly skeleton: Equation;
  readonly medium: MediumChoice;
  readonly share: Rational | null;
}

/** The first step for a skeleton: its text, its helpers and its share. */
export const readSkeleton = (fields: SkeletonFields, options: DeskOptions): Result<ReadSkeleton> =>
  chain(inField(readSketch(fields.text, options, fields.medium), fields.field), (skeleton) =>
    chain(readMedium(fields.medium, options, fields.mediumField), (medium) =>
      map(shareOf(fields), (share) => ({ skeleton, medium, share })),
    ),
  );

const shareOf = ({ share, field }: SkeletonFields): Result<Rational | null> =>
  share === undefined ? success(null) : readShare(share, `${field}.share`);

/** A fault that the floor below placed in `medium`, placed where the ask gives the medium. */
const renamed = <T>(result: Result<T>, to: string): Result<T> =>
  result.ok || result.fault.field !== 'medium' ? result : failure({ ...result.fault, field: to });

/** The second step for a redox skeleton: helpers found, split into its halves. */
export const balanceWhole = ({ skeleton, medium }: ReadSkeleton, fields: SkeletonFields): Result<RedoxReaction> =>
  inField(renamed(balanceRedox(skeleton, medium, fields.settle), fields.mediumField), fields.field);

/** The second step for a half-reaction: helpers and electrons found. */
export const balanceSkeleton = (
  { skeleton, medium }: ReadSkeleton,
  fields: SkeletonFields,
  meter: Meter = startMeter(),
): Result<HalfReaction> =>
  inField(renamed(completed(skeleton, medium, fields, meter), fields.mediumField), fields.field);

/** A `settle` that several skeletons share is for those that need it. */
const completed = (
  skeleton: Equation,
  medium: MediumChoice,
  { settle, sharedSettle }: SkeletonFields,
  meter: Meter,
): Result<HalfReaction> => {
  const shared = settle !== undefined && sharedSettle === true;
  const alone = shared ? completeHalf(skeleton, medium, undefined, meter) : null;
  return alone?.ok === true && alone.value.dimension === 1 ? alone : completeHalf(skeleton, medium, settle, meter);
};

const fieldsAt = (cell: ComposedFields, electrode: Electrode): readonly SkeletonFields[] =>
  cell[electrode].map((reaction, index) => {
    const field = `${electrode}[${String(index)}]`;
    const own = typeof reaction === 'string' ? { skeleton: reaction } : reaction;
    return {
      text: own.skeleton,
      medium: own.medium ?? cell.medium,
      settle: own.settle ?? cell.settle,
      sharedSettle: own.settle === undefined,
      share: own.share,
      field,
      mediumField: own.medium === undefined ? 'medium' : `${field}.medium`,
    };
  });

/** Reactions that one electrode may have. */
export const MOST_REACTIONS = 100;

const crowded = (cell: ComposedFields): Result<never> | null => {
  const electrode = (['anode', 'cathode'] as const).find((one) => cell[one].length > MOST_REACTIONS);
  if (electrode === undefined) return null;
  const limit = `${String(MOST_REACTIONS)} reactions at an electrode`;
  return failure({ code: 'too-hard', field: electrode, limit, message: `There may be at most ${limit}.` });
};

/**
 * Both electrodes of a cell: all skeletons are read before one is balanced. Of several faults the first in the
 * contract's order is told; `too-hard` for more than `MOST_REACTIONS` at one electrode.
 */
export const readElectrodes = (cell: ComposedFields, options: DeskOptions): Result<Electrodes> => {
  const full = crowded(cell);
  if (full !== null) return full;
  const anode = fieldsAt(cell, 'anode');
  const fields = [...anode, ...fieldsAt(cell, 'cathode')];
  return chain(allByRank(fields.map((one) => readSkeleton(one, options))), (skeletons) => {
    // all reactions draw on one measure of work
    const meter = startMeter();
    const halves = skeletons.map((one, at) => placed(one, fields[at], meter));
    return chain(allByRank(halves), (list) => {
      if (list.every(({ half }) => half.dimension === 1) && cell.settle !== undefined) return needless(cell.settle);
      return success({ anode: list.slice(0, anode.length), cathode: list.slice(anode.length) });
    });
  });
};

const placed = (skeleton: ReadSkeleton, fields: SkeletonFields | undefined, meter: Meter): Result<Placed> => {
  if (fields === undefined) throw new RangeError('a skeleton without its fields');
  return map(balanceSkeleton(skeleton, fields, meter), (half) => ({ half, share: skeleton.share }));
};

/** Two electrodes to their cell reaction: read, balanced, composed. */
export const composeFields = (cell: ComposedFields, options: DeskOptions): Result<CellReaction> =>
  chain(readElectrodes(cell, options), (electrodes) => composeCell(electrodes, { separator: cell.separator === true }));

/** A cell diagram to its cell reaction: read, told apart into electrodes, composed. */
export const composeDiagram = (text: string, options: DeskOptions): Result<CellReaction> =>
  chain(inField(readDiagram(text, options), 'diagram'), (diagram) =>
    inField(
      chain(electrodesOfDiagram(diagram), (electrodes) => composeCell(electrodes)),
      'diagram',
    ),
  );

/** A fault of a part, seen from the whole ask: `anode[0]` in `cell` is `cell.anode[0]`. */
export const under = <T>(result: Result<T>, prefix: string): Result<T> =>
  result.ok
    ? result
    : failure({
        ...result.fault,
        field: result.fault.field === undefined ? prefix : `${prefix}.${result.fault.field}`,
      });
