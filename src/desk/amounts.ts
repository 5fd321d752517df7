import type { Circuit, ParallelReaction } from '../amounts/branches.ts';
import { isEven, ledgerOf } from '../balance/ledger.ts';
import { type Reaction, type Term, showReaction } from '../balance/reaction.ts';
import { hasShares } from '../cell/shares.ts';
import { composeCell } from '../cell/compose.ts';
import { type Rational, ZERO, isZero } from '../exact/rational.ts';
import { note } from '../report/note.ts';
import { type Result, chain, failure, inField, map, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import type { Equation } from '../species/equation.ts';
import { isElectron, sameSpecies } from '../species/species.ts';
import { type SkeletonFields, balanceSkeleton, composeDiagram, readElectrodes, under } from './electrodes.ts';
import { type DeskOptions, readSketch, readWritten } from './hydronium.ts';
import { allByRank } from '../report/precedence.ts';
import type { AskOf, AskedMedium, CellFields, SeriesCell } from './schema/ask.ts';
import { readMedium } from './settings.ts';

/** What says which reactions the charge flows through: an ask of amounts, or a further cell in series. */
type CircuitFields = AskOf<'amounts'> | SeriesCell | LoneHalf;

/** A half-reaction by itself. */
interface LoneHalf {
  readonly half: string;
  readonly medium?: AskedMedium | undefined;
  readonly settle?: string | undefined;
}

/** The terms as written, a species that stands twice counted once; what nets to 0 is left out. */
const writtenReaction = ({ left, right }: Equation): Reaction => {
  const terms: Term[] = [];
  const add = ({ species, nu }: Term): void => {
    const at = terms.findIndex((term) => sameSpecies(term.species, species));
    const before = terms[at];
    if (before === undefined) terms.push({ species, nu });
    else terms[at] = { species: before.species, nu: before.nu.add(nu) };
  };
  for (const { species, coefficient } of left) add({ species, nu: coefficient.neg() });
  for (const { species, coefficient } of right) add({ species, nu: coefficient });
  return { terms: terms.filter((term) => !isZero(term.nu)) };
};

const electronsIn = (reaction: Reaction): Rational =>
  reaction.terms.find((term) => isElectron(term.species))?.nu.abs() ?? ZERO;

const noElectrons = (reaction: Reaction, field: string, text: string): Result<never> =>
  failure({
    code: 'no-electrons',
    field,
    span: wholeSpan(text),
    message: 'This conserves without electrons: no charge goes with it.',
    hint: 'Give a half-reaction, in which e^- stands on one side.',
    reaction: showReaction(reaction),
  });

/** A half-reaction that conserves is used as written, fractions included; any other is a skeleton. */
const parallelReaction = (
  equation: Equation,
  fields: SkeletonFields,
  options: DeskOptions,
): Result<ParallelReaction> => {
  const written = writtenReaction(equation);
  const conserves = written.terms.length > 0 && isEven(ledgerOf(written));
  if (conserves && isZero(electronsIn(written))) return noElectrons(written, fields.field, fields.text);
  if (conserves) {
    const used = note('used-as-written', 'The half-reaction conserves atoms and charge and was used as written.');
    return success({ reaction: written, electrons: electronsIn(written) }, [used]);
  }
  return chain(readMedium(fields.medium, options, fields.mediumField), (medium) =>
    chain(readSketch(fields.text, options, fields.medium), (skeleton) =>
      map(balanceSkeleton({ skeleton, medium, share: null }, fields), ({ reaction, electrons }) => ({
        reaction,
        electrons,
      })),
    ),
  );
};

interface AskedHalf {
  readonly half: string;
  readonly share?: string | undefined;
  readonly field: string;
}

const readHalves = (
  halves: readonly AskedHalf[],
  ask: CircuitFields,
  options: DeskOptions,
): Result<readonly ParallelReaction[]> => {
  const read = allByRank(halves.map(({ half, field }) => inField(readWritten(half, options), field)));
  return chain(read, (equations) =>
    allByRank(
      equations.map((equation, at) => {
        const { half = '', share, field = '' } = halves[at] ?? {};
        const fields: SkeletonFields = {
          text: half,
          medium: ask.medium,
          settle: ask.settle,
          sharedSettle: halves.length > 1,
          field,
          mediumField: 'medium',
        };
        return map(parallelReaction(equation, fields, options), (reaction) =>
          share === undefined ? reaction : { ...reaction, share },
        );
      }),
    ),
  );
};

const cellCircuit = (cell: CellFields, ask: CircuitFields, options: DeskOptions): Result<Circuit> => {
  if ('diagram' in cell) {
    return map(composeDiagram(cell.diagram, options), (composed) => ({
      kind: 'cell',
      cell: composed,
      shares: { anode: false, cathode: false },
    }));
  }
  const whole = { ...cell, medium: cell.medium ?? ask.medium, settle: cell.settle ?? ask.settle };
  return chain(readElectrodes(whole, options), (electrodes) =>
    map(composeCell(electrodes, { separator: cell.separator === true }), (composed) => ({
      kind: 'cell',
      cell: composed,
      shares: { anode: hasShares(electrodes.anode), cathode: hasShares(electrodes.cathode) },
    })),
  );
};

/** What the charge of an amounts ask flows through: a half-reaction, an electrode, or a cell. */
export const readCircuit = (ask: CircuitFields, options: DeskOptions): Result<Circuit> => {
  if ('cell' in ask) return under(cellCircuit(ask.cell, ask, options), 'cell');
  if ('half' in ask) {
    return chain(readHalves([{ half: ask.half, field: 'half' }], ask, options), ([half]) => {
      if (half === undefined) throw new RangeError('one half-reaction in, none out');
      return success({ kind: 'half', half });
    });
  }
  const halves = ask.electrode.map((one, at) => ({ ...one, field: `electrode[${String(at)}]` }));
  return map(readHalves(halves, ask, options), (reactions) => ({ kind: 'electrode', reactions }));
};
