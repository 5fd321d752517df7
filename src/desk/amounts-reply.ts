import { computeAmounts, readTexts } from '../amounts/amounts.ts';
import { type Circuit, readShare } from '../amounts/branches.ts';
import { computeSeries } from '../amounts/series.ts';
import { type TankBalance, tankBalance } from '../amounts/tank-balance.ts';
import type { AmountsAnswer, AmountsRequest } from '../amounts/working.ts';
import { type Result, chain, failure, inField, map, success } from '../report/result.ts';
import { readSpecies } from '../species/read.ts';
import type { Species } from '../species/species.ts';
import { readCircuit } from './amounts.ts';
import { readCorrelations } from './correlations.ts';
import { dividedOf } from './divided.ts';
import { under } from './electrodes.ts';
import { asText, withFoundShares } from './found-shares.ts';
import type { DeskOptions } from './hydronium.ts';
import { allByRank } from '../report/precedence.ts';
import type { AmountsAnswerShown } from './schema/answer.ts';
import type { AskOf, SeriesCell } from './schema/ask.ts';
import { strictly } from './strict-amounts.ts';

type AmountsAsk = AskOf<'amounts'>;

/** A circuit with what keeps its electrolytes apart. */
export interface PlacedCircuit {
  readonly circuit: Circuit;
  readonly divided: boolean | null;
}

/** An answer with the circuits that its charge flows through. */
export interface AmountsReply {
  readonly answer: AmountsAnswerShown;
  readonly circuits: readonly PlacedCircuit[];
}

interface ReadCell extends PlacedCircuit {
  readonly species: Species;
}

const sharesOf = (ask: AmountsAsk | SeriesCell): readonly Result<unknown>[] =>
  'electrode' in ask
    ? ask.electrode.flatMap(({ share }, at) => (share === undefined ? [] : [readShare(share, at)]))
    : [];

/** The reactions, the species and the quantities of one cell: all are read before a fault of one is told. */
const readCell = (ask: AmountsAsk | SeriesCell, options: DeskOptions): Result<ReadCell> => {
  const circuit = readCircuit(ask, options);
  const asked = inField(readSpecies(ask.species, options), 'species');
  const { given = {}, want } = ask;
  const texts = readTexts({ given, ...(want === undefined ? {} : { want }), ...('ask' in ask ? stackOf(ask) : {}) });
  return chain(withoutNotes(allByRank<unknown>([circuit, asked, texts, ...sharesOf(ask)])), () =>
    chain(circuit, (through) =>
      map(asked, ({ species }) => ({
        circuit: through,
        divided: 'cell' in ask ? dividedOf(ask.cell, options) : null,
        species,
      })),
    ),
  );
};

/** The notes come again where the values are used. */
const withoutNotes = <T>(result: Result<T>): Result<T> => (result.ok ? success(result.value) : result);

const stackOf = ({ cells, bypass }: AmountsAsk) => ({
  ...(cells === undefined ? {} : { cells }),
  ...(bypass === undefined ? {} : { bypass }),
});

/** What may be correlated: the quantities given, the bypass, the shares of the reactions. */
const inputsOf = (ask: AmountsAsk): readonly string[] => [
  ...Object.keys(ask.given).filter((name) => name !== 'record'),
  ...(ask.bypass === undefined ? [] : ['bypass']),
  ...('electrode' in ask
    ? ask.electrode.flatMap(({ share }, at) => (share === undefined ? [] : [`electrode[${String(at)}].share`]))
    : []),
];

const requestOf = (ask: AmountsAsk, { circuit, species }: ReadCell): Result<AmountsRequest> =>
  map(readCorrelations(ask.correlations ?? [], inputsOf(ask)), (correlations) => ({
    circuit,
    species,
    given: ask.given,
    correlations,
    budget: ask.budget === true,
    ...(ask.want === undefined ? {} : { want: ask.want }),
    ...stackOf(ask),
  }));

/** The balance of the tank for the charge of an answer: what it was derived from need not be derived again. */
const tankOf = (request: AmountsRequest, answer: AmountsAnswer, stack: object): Result<TankBalance> => {
  const { charge, efficiency } = answer.quantities;
  const circuit = withFoundShares(request, answer);
  const lone = circuit.kind === 'half' || (circuit.kind === 'electrode' && circuit.reactions.length === 1);
  const { blank } = request.given;
  const given = {
    ...(charge === undefined ? {} : { charge: asText(charge) }),
    ...(lone && efficiency !== undefined ? { efficiency: asText(efficiency) } : {}),
    ...(blank === undefined ? {} : { blank }),
  };
  return inField(tankBalance({ circuit, given, ...stack }), 'tank');
};

/** `series[0]` is the ask itself, so that its own fields have no prefix, and `series[1]` its first further cell. */
const ownFields = <T>(result: Result<T>): Result<T> => {
  if (result.ok || result.fault.field === undefined) return result;
  const field = result.fault.field.replace(/^series\[(\d+)\]\.?/, (_, at: string) =>
    at === '0' ? '' : `series[${String(Number(at) - 1)}].`,
  );
  return failure({ ...result.fault, field });
};

const computed = (
  ask: AmountsAsk,
  request: AmountsRequest,
  further: readonly ReadCell[],
): Result<readonly AmountsAnswer[]> => {
  if (ask.series === undefined) return map(computeAmounts(request), (answer) => [answer]);
  const others = ask.series.flatMap(({ given = {}, want }, at) => {
    const cell = further[at];
    if (cell === undefined) return [];
    const { circuit, species } = cell;
    return [{ circuit, species, given, budget: ask.budget === true, ...(want === undefined ? {} : { want }) }];
  });
  return ownFields(computeSeries([request, ...others], {}));
};

const answered = (
  ask: AmountsAsk,
  request: AmountsRequest,
  [own, ...others]: readonly AmountsAnswer[],
): Result<AmountsAnswerShown> => {
  if (own === undefined) throw new RangeError('a cell without its answer');
  const whole = { ...own, ...(ask.series === undefined ? {} : { series: others }) };
  return ask.tank === true
    ? map(tankOf(request, own, stackOf(ask)), (tank) => ({ ...whole, tank }))
    : success<AmountsAnswerShown>(whole);
};

/** Further cells that one ask may have in series. */
const MOST_CELLS = 100;

const tooMany: Result<never> = failure({
  code: 'too-hard',
  field: 'series',
  limit: `${String(MOST_CELLS)} cells in series`,
  message: `There may be at most ${String(MOST_CELLS)} further cells in series.`,
  hint: 'Cells that are alike are one stack: give cells.',
});

/** All cells that the charge flows through, the one of the ask first. */
const readCells = (ask: AmountsAsk, options: DeskOptions): Result<readonly ReadCell[]> => {
  const { series = [] } = ask;
  if (series.length > MOST_CELLS) return tooMany;
  const further = series.map((one, at) => under(readCell(one, options), `series[${String(at)}]`));
  return allByRank([readCell(ask, options), ...further]);
};

/**
 * What Faraday's law makes of what is given, with the balance of the tank and the further cells in series where they
 * are asked for. Faults: those of reading and balancing, of `computeAmounts` and of `tankBalance`.
 */
export const amountsOf = (ask: AmountsAsk, options: DeskOptions): Result<AmountsReply> =>
  strictly(
    chain(readCells(ask, options), (cells) => {
      const [own, ...further] = cells;
      if (own === undefined) throw new RangeError('an ask without its own cell');
      return chain(requestOf(ask, own), (request) =>
        chain(computed(ask, request, further), (answers) =>
          map(answered(ask, request, answers), (answer) => ({ answer, circuits: cells })),
        ),
      );
    }),
    ask,
  );
