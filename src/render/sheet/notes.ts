import type { WholeRun, WholeTank } from '../../desk/sheet/answer.ts';

/** Said elsewhere on a sheet: water and its ions stand in no column; goals and weighings say theirs themselves. */
const ELSEWHERE = new Set(['summed', 'efficiency-over-100']);

const answeredRuns = (tank: WholeTank): readonly WholeRun[] =>
  tank.runs.flatMap((run) => ('fault' in run ? [] : [run]));

/** What the reader of a tank and its runs must know, each once. */
export const tankNotes = (tank: WholeTank): readonly string[] => {
  const told = [...tank.cell.notes, ...answeredRuns(tank).flatMap((run) => run.amounts.notes)];
  return [...new Set(told.filter(({ code }) => !ELSEWHERE.has(code)).map(({ message }) => message))];
};

/** What the sheet's writer noted at a run. */
export const writtenNotes = (tank: WholeTank): readonly string[] =>
  answeredRuns(tank).flatMap(({ name, note }) => (note === null ? [] : [`${name}: ${note}`]));
