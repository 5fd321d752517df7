import type { Fault } from '../report/fault.ts';
import { type Result, chain, inField, map } from '../report/result.ts';
import { readSpecies } from '../species/read.ts';
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
import { dividedOf } from './divided.ts';
import { cautionsOfCell, cautionsOfCircuits, cautionsOfHalf, cautionsOfReaction } from './cautions.ts';
import { amountsOf } from './amounts-reply.ts';
import { type DeskOptions, readWritten } from './hydronium.ts';
import { withIrreducible } from './irreducible.ts';
import { cellPer, halfPer, redoxPer } from './per.ts';
import { readAsk } from './read-ask.ts';
import type { Answer } from './schema/answer.ts';
import type { Ask, AskOf } from './schema/ask.ts';
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
const answerSpecies = (ask: AskOf<'species'>, options: DeskOptions): Result<Reply> =>
  chain(inField(readSpecies(ask.text, options), 'text'), (reading) =>
    map(showReading(reading), (answer) => ({ ask: 'species', answer, cautions: [] })),
  );

/** text -> species and coefficients, nothing balanced */
const answerEquation = (ask: AskOf<'equation'>, options: DeskOptions): Result<Reply> =>
  map(inField(readWritten(ask.text, options), 'text'), (equation) => ({
    ask: 'equation',
    answer: showEquation(equation),
    cautions: [],
  }));

/** text -> skeleton -> half-reaction -> the scale asked for */
const answerHalf = (ask: AskOf<'half'>, options: DeskOptions): Result<Reply> => {
  const fields = skeletonFields(ask);
  return chain(readSkeleton(fields, options), (skeleton) => {
    const balanced = balanceSkeleton(skeleton, fields);
    const half = ask.irreducible === true ? withIrreducible(balanced, skeleton, true) : balanced;
    return chain(half, (found) =>
      map(halfPer(found, ask.per, options), (scaled) => ({
        ask: 'half',
        answer: showHalf(scaled),
        cautions: cautionsOfHalf(found),
      })),
    );
  });
};

/** text -> skeleton -> overall reaction -> its two halves -> the scale asked for */
const answerRedox = (ask: AskOf<'redox'>, options: DeskOptions): Result<Reply> => {
  const fields = skeletonFields(ask);
  return chain(readSkeleton(fields, options), (skeleton) => {
    const balanced = balanceWhole(skeleton, fields);
    const redox = ask.irreducible === true ? withIrreducible(balanced, skeleton, false) : balanced;
    return chain(redox, (found) =>
      map(redoxPer(found, ask.per, options), (scaled) => ({
        ask: 'redox',
        answer: showRedox(scaled),
        cautions: cautionsOfReaction(found.overall, found.medium),
      })),
    );
  });
};

/** texts -> skeletons -> half-reactions -> cell reaction -> the scale asked for */
const answerCell = (ask: AskOf<'cell'>, options: DeskOptions): Result<Reply> => {
  const cell = 'diagram' in ask ? composeDiagram(ask.diagram, options) : composeFields(ask, options);
  return chain(cell, (composed) =>
    map(cellPer(composed, ask.per, options), (scaled) => ({
      ask: 'cell',
      answer: showCell(scaled),
      cautions: cautionsOfCell(composed, dividedOf(ask, options)),
    })),
  );
};

/** text -> equation as written -> ledger, verdict, repairs; of a whole cell for each part, then all together */
const answerAudit = (ask: AskOf<'audit'>, options: DeskOptions): Result<Reply> => {
  const listed = ask.contributions === true;
  return 'equation' in ask
    ? map(auditOfEquation(ask, options), ({ audit, written }) => ({
        ask: 'audit',
        answer: showAudit(audit, listed ? written : null),
        cautions: [],
      }))
    : map(auditOfCell(ask, options), ({ audit, written }) => ({
        ask: 'audit',
        answer: showCellAudit(audit, listed ? written : null),
        cautions: [],
      }));
};

/** texts -> reactions with their electron numbers -> what Faraday's law makes of what is given */
const answerAmounts = (ask: AskOf<'amounts'>, options: DeskOptions): Result<Reply> =>
  map(amountsOf(ask, options), ({ answer: amounts, circuits }) => ({
    ask: 'amounts',
    answer: amounts,
    cautions: cautionsOfCircuits(circuits),
  }));

const reply = (ask: Ask, options: DeskOptions): Result<Reply> => {
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
