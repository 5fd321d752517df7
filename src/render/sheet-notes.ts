import type { WholeTank } from '../desk/sheet-answer.ts';

/** Said elsewhere on a sheet: water and its ions stand in no column; goals and weighings say theirs themselves. */
const ELSEWHERE = new Set(['summed', 'efficiency-over-100']);

/** The notes of a tank and its runs, each once; what the sheet's writer noted at a run comes last. */
export const tankNotes = (tank: WholeTank): readonly string[] => {
  const answered = tank.runs.flatMap((run) => ('fault' in run ? [] : [run]));
  const told = [...tank.cell.notes, ...answered.flatMap((run) => run.amounts.notes)];
  const messages = told.filter(({ code }) => !ELSEWHERE.has(code)).map(({ message }) => message);
  const written = answered.flatMap(({ name, note }) => (note === null ? [] : [`${name}: ${note}`]));
  return [...new Set([...messages, ...written])];
};
