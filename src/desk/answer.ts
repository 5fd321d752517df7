import { computeAmounts } from '../amounts/amounts.ts';
import type { Fault } from '../report/fault.ts';
import { type Result, chain, inField, map } from '../report/result.ts';
import { readDiagram } from '../species/diagram.ts';
import { type ReadingOptions, readEquation, readSpecies } from '../species/read.ts';
import {
  type SkeletonFields,
  balanceSkeleton,
  balanceWhole,
  composeDiagram,
  composeFields,
  readSkeleton,
} from './electrodes.ts';
import { type Addressee, type Reply, CONTRACT, addresseeOf, distinctNotes, faulted } from './envelope.ts';
import { auditOfCell, auditOfEquation } from './audits.ts';
import { cautionsOfCell, cautionsOfCircuit, cautionsOfHalf, cautionsOfReaction } from './cautions.ts';
import { readCircuit } from './amounts.ts';
import { allByRank } from './precedence.ts';
import { readAsk } from './read-ask.ts';
import type { Answer } from './schema/answer.ts';
import type { Ask, AskOf, CellFields } from './schema/ask.ts';
import { readSettings } from './settings.ts';
import { showAudit, showCellAudit } from './show/audit.ts';
import { showCell, showHalf, showRedox } from './show/reactions.ts';
import { showEquation, showReading } from './show/species.ts';

const skeletonFields = ({ skeleton, medium, settle }: AskOf<'half'> | AskOf<'redox'>): SkeletonFields => ({
  text: skeleton,
  medium,
  settle,
  field: 'skeleton',
  mediumField: 'medium',
});

/** text -> species -> composition, molar mass, oxidation numbers */
const answerSpecies = (ask: AskOf<'species'>, options: ReadingOptions): Result<Reply> =>
  chain(inField(readSpecies(ask.text, options), 'text'), (reading) =>
    map(showReading(reading), (answer) => ({ ask: 'species', answer, cautions: [] })),
  );

/** text -> species and coefficients, nothing balanced */
const answerEquation = (ask: AskOf<'equation'>, options: ReadingOptions): Result<Reply> =>
  map(inField(readEquation(ask.text, options), 'text'), (equation) => ({
    ask: 'equation',
    answer: showEquation(equation),
    cautions: [],
  }));

/** text -> skeleton -> half-reaction */
const answerHalf = (ask: AskOf<'half'>, options: ReadingOptions): Result<Reply> => {
  const fields = skeletonFields(ask);
  return chain(readSkeleton(fields, options), (skeleton) =>
    map(balanceSkeleton(skeleton, fields), (half) => ({
      ask: 'half',
      answer: showHalf(half),
      cautions: cautionsOfHalf(half),
    })),
  );
};

/** text -> skeleton -> overall reaction -> its two halves */
const answerRedox = (ask: AskOf<'redox'>, options: ReadingOptions): Result<Reply> => {
  const fields = skeletonFields(ask);
  return chain(readSkeleton(fields, options), (skeleton) =>
    map(balanceWhole(skeleton, fields), (redox) => ({
      ask: 'redox',
      answer: showRedox(redox),
      cautions: cautionsOfReaction(redox.overall, redox.medium),
    })),
  );
};

/** True where something keeps the electrolytes apart: a separator, the bridge of a diagram. null: the ask does not say. */
const dividedOf = (cell: CellFields, options: ReadingOptions): boolean | null => {
  if (!('diagram' in cell)) return cell.separator ?? null;
  const diagram = readDiagram(cell.diagram, options);
  return diagram.ok ? diagram.value.bridge : null;
};

/** texts -> skeletons -> half-reactions -> cell reaction */
const answerCell = (ask: AskOf<'cell'>, options: ReadingOptions): Result<Reply> => {
  const cell = 'diagram' in ask ? composeDiagram(ask.diagram, options) : composeFields(ask, options);
  return map(cell, (composed) => ({
    ask: 'cell',
    answer: showCell(composed),
    cautions: cautionsOfCell(composed, dividedOf(ask, options)),
  }));
};

/** text -> equation as written -> ledger, verdict, repairs; of a whole cell for each part, then all together */
const answerAudit = (ask: AskOf<'audit'>, options: ReadingOptions): Result<Reply> =>
  'equation' in ask
    ? map(auditOfEquation(ask, options), (audit) => ({ ask: 'audit', answer: showAudit(audit), cautions: [] }))
    : map(auditOfCell(ask, options), (audit) => ({ ask: 'audit', answer: showCellAudit(audit), cautions: [] }));

/** texts -> reactions with their electron numbers -> what Faraday's law makes of what is given */
const answerAmounts = (ask: AskOf<'amounts'>, options: ReadingOptions): Result<Reply> => {
  const circuit = readCircuit(ask, options);
  const asked = inField(readSpecies(ask.species, options), 'species');
  return chain(allByRank<unknown>([circuit, asked]), () =>
    chain(circuit, (through) =>
      chain(asked, ({ species }) =>
        map(computeAmounts({ circuit: through, species, given: ask.given, ...wanted(ask) }), (amounts) => ({
          ask: 'amounts',
          answer: amounts,
          cautions: cautionsOfCircuit(through, 'cell' in ask ? dividedOf(ask.cell, options) : null),
        })),
      ),
    ),
  );
};

const wanted = ({ want }: AskOf<'amounts'>): { readonly want?: Readonly<Record<string, string>> } =>
  want === undefined ? {} : { want };

const reply = (ask: Ask, options: ReadingOptions): Result<Reply> => {
  switch (ask.ask) {
    case 'species':
      return answerSpecies(ask, options);
    case 'equation':
      return answerEquation(ask, options);
    case 'half':
      return answerHalf(ask, options);
    case 'redox':
      return answerRedox(ask, options);
    case 'cell':
      return answerCell(ask, options);
    case 'audit':
      return answerAudit(ask, options);
    case 'amounts':
      return answerAmounts(ask, options);
  }
};

const brokenProgram = (problem: unknown): Fault => ({
  code: 'too-hard',
  limit: 'the program itself',
  message: `This ask broke the program: ${problem instanceof Error ? problem.message : String(problem)}.`,
  hint: 'Please report it with the ask.',
});

const sealed = (addressee: Addressee, result: Result<Reply>): Answer => {
  if (!result.ok) return faulted(addressee, result.fault);
  const { id } = addressee;
  // The order in which the contract names the fields: id, contract, ask, ok, answer.
  const head = { ...(id === undefined ? {} : { id }), contract: CONTRACT, ask: result.value.ask, ok: true } as const;
  return { ...head, ...result.value, notes: distinctNotes(result.notes) };
};

/**
 * The answer to one ask of the contract, whatever `ask` is: every shell goes through here. Never throws.
 * An exception is a broken program; it becomes a fault, so that the rest of a batch is answered.
 */
export const answer = (ask: unknown): Answer => {
  const addressee = addresseeOf(ask);
  try {
    return sealed(
      addressee,
      chain(readAsk(ask), (valid) => chain(readSettings(valid), (options) => reply(valid, options))),
    );
  } catch (problem) {
    return faulted(addressee, brokenProgram(problem));
  }
};
