import { type Result, chain, failure, success } from '../../report/result.ts';
import { answer } from '../answer.ts';
import { type SheetRun, runSchema } from '../schema/sheet.ts';
import type { Efficiency, RunAnswer, WeighedTank, WholeRun } from './answer.ts';
import { type FoundEfficiency, foundEfficiency, showEfficiency, togetherOf } from './efficiency.ts';
import { checked, nameOf, sheetField } from './part.ts';
import { type Records, type UsedRecord, useRecord } from './record.ts';
import { standingOut } from './standing-out.ts';
import { tankAsk } from './tank-ask.ts';
import type { TankContext } from './tank-parts.ts';

/** What belongs to a run and not to the law. */
const BESIDES = new Set(['label', 'product', 'note', 'weighed', 'record']);
const KEYS = { mass: 'weighed' };
const RECORD_KEYS = { ...KEYS, charge: 'record', time: 'record' };
/** A record gives these: a run that has one may not state them too. */
const RECORDED = ['charge', 'current', 'time'] as const;

const recordOf = (run: SheetRun, records: Records): Result<UsedRecord | null> => {
  if (run.record === undefined) return success(null);
  const stated = RECORDED.find((name) => run[name] !== undefined);
  if (stated === undefined) return useRecord(run.record, records);
  const message = `The record gives the charge and the time: ${stated} cannot be stated besides.`;
  return failure({ code: 'contradiction', field: stated, message, hint: `Leave ${stated} out, or the record.` });
};

const givenOf = (run: SheetRun, record: UsedRecord | null): object => {
  const quantities = Object.entries(run).filter(([name]) => !BESIDES.has(name));
  return {
    ...Object.fromEntries(quantities),
    ...(run.weighed === undefined ? {} : { mass: run.weighed }),
    ...record?.given,
  };
};

/** A run that was answered, and the efficiency that its weighing found. */
interface Answered {
  readonly run: WholeRun;
  readonly found: FoundEfficiency | null;
}

const answered = (context: TankContext, run: SheetRun, record: UsedRecord | null): Result<Answered> => {
  const product = run.product ?? context.product;
  const ask = tankAsk(context.head, context.tank, product, givenOf(run, record));
  const keys = record === null ? KEYS : RECORD_KEYS;
  const amounts = answer(ask);
  if (!amounts.ok) return failure(sheetField(amounts.fault, keys));
  if (amounts.ask !== 'amounts') throw new RangeError('amounts were answered with something else');
  const found = run.weighed === undefined || run.efficiency !== undefined ? null : foundEfficiency(ask, keys);
  const weighed = found === null ? null : { ...showEfficiency(found), standsOut: null };
  const shown = { name: run.label, note: run.note ?? null, product, amounts, weighed, record: record?.shown ?? null };
  return success({ run: shown, found });
};

const answerRun = (context: TankContext, value: unknown, at: number, records: Records): Result<Answered> => {
  const path = [...context.path, 'runs', at];
  return chain(checked(context.sheet, runSchema, value, path, 'a run'), (run) => {
    const done = chain(recordOf(run, records), (record) => answered(context, run, record));
    return done.ok ? done : failure(context.sheet.place(done.fault, path));
  });
};

/** Weighed runs of the tank's own product are held against one another. */
const judged = (all: readonly Answered[], product: string): ReadonlyMap<WholeRun, string | null> => {
  const weighed = all.filter(({ run, found }) => found !== null && run.product === product);
  const verdicts = standingOut(weighed.flatMap(({ found }) => found ?? []));
  return new Map(weighed.map(({ run }, at) => [run, verdicts[at] ?? null]));
};

const together = (
  all: readonly Answered[],
  product: string,
  verdicts: ReadonlyMap<WholeRun, string | null>,
): WeighedTank | null => {
  const weighed = all.flatMap(({ run, found }) => (found === null || run.product !== product ? [] : [{ run, found }]));
  if (weighed.length === 0) return null;
  const kept = weighed.filter(({ run }) => (verdicts.get(run) ?? null) === null);
  const shown = (some: typeof weighed): Efficiency => showEfficiency(togetherOf(some.map(({ found }) => found)));
  const without = kept.length === 0 || kept.length === weighed.length ? null : shown(kept);
  return { ...shown(weighed), runs: weighed.length, without };
};

/** The runs of a tank, each by itself, and their weighings held against one another. */
export const answerRuns = (
  context: TankContext,
  records: Records,
): { readonly runs: readonly RunAnswer[]; readonly weighed: WeighedTank | null } => {
  const values = context.tank.runs ?? [];
  const results = values.map((value, at) => answerRun(context, value, at, records));
  const all = results.flatMap((result) => (result.ok ? [result.value] : []));
  const verdicts = judged(all, context.product);
  const runs = results.map((result, at): RunAnswer => {
    if (!result.ok) return { name: nameOf(values[at], 'label', `run ${String(at + 1)}`), fault: result.fault };
    const { run } = result.value;
    const standsOut = verdicts.get(run) ?? null;
    return run.weighed === null ? run : { ...run, weighed: { ...run.weighed, standsOut } };
  });
  return { runs, weighed: together(all, context.product, verdicts) };
};
