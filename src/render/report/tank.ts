import type { ShownScaledHalf } from '../../desk/schema/shape.ts';
import type { RunAnswer, WholeTank } from '../../desk/sheet/answer.ts';
import { escaped, formulaHtml } from '../markup.ts';
import { UNPAINTED } from '../look.ts';
import { speciesText } from '../spelling.ts';
import { bandFigure, recordFigures } from './pictures.ts';
import { REPORT_WRITING, capital, faultHtml, saidList } from './words.ts';
import { type RunColumn, runTable, standsOut } from '../sheet/table.ts';
import { tankNotes, writtenNotes } from '../sheet/notes.ts';
import {
  budgetWords,
  efficiencyText,
  gasSentence,
  recordSentence,
  targetSentence,
  weighedSentence,
} from '../sheet/words.ts';

const halfRow = (name: string, half: ShownScaledHalf, at: number): string => {
  const times = half.multiplier === undefined || half.multiplier === '1' ? '' : `${escaped(half.multiplier)} ×`;
  const head = at === 0 ? name : '';
  return `<tr><th scope="row">${head}</th><td class="times">${times}</td><td>${formulaHtml(half.reaction.plain)}</td></tr>`;
};

const reactionTable = ({ cell: { answer: cell } }: WholeTank): string => {
  const halves = [
    ...cell.anode.map((half, at) => halfRow('anode', half, at)),
    ...cell.cathode.map((half, at) => halfRow('cathode', half, at)),
  ];
  const overall = cell.overall.plain === '' ? 'nothing is left' : formulaHtml(cell.overall.plain);
  const electrons = `<p class="basis">${escaped(cell.electrons)} electrons in the overall reaction</p>`;
  return (
    `<div><table class="reactions"><caption>Reactions</caption><tbody>${halves.join('')}` +
    `<tr><th scope="row">overall</th><td class="times"></td><td>${overall}</td></tr></tbody></table>${electrons}</div>`
  );
};

const runsTable = (tank: WholeTank): string => {
  const table = runTable(tank);
  if (table === null) return '';
  const head = table.columns.map(({ heading, isSpecies, unit }) => {
    const name = isSpecies ? formulaHtml(heading) : heading;
    return `<th scope="col">${name}<span>${escaped(unit)}</span></th>`;
  });
  const rows = table.rows.map(({ run, cells }) => {
    const name = escaped(run.name);
    const marked = standsOut(run) === null ? name : `<span class="alarm">${name}</span>`;
    return `<tr><td>${marked}</td>${cells.map((cell, at) => numberCell(cell, table.columns[at])).join('')}</tr>`;
  });
  return (
    `<table class="rows"><caption>Runs</caption><thead><tr><th scope="col">run</th>${head.join('')}</tr></thead>` +
    `<tbody>${rows.join('')}</tbody></table>`
  );
};

/** A number, which on a narrow page carries the heading of its column with it. */
const numberCell = (cell: string, column: RunColumn | undefined): string => {
  if (column === undefined || cell === '') return '<td class="none"></td>';
  const { heading, isSpecies, unit } = column;
  const name = isSpecies ? speciesText(heading, { unicode: true, paint: UNPAINTED }) : heading;
  return `<td data-of="${escaped(`${name}, ${unit}`)}">${escaped(cell)}</td>`;
};

const weighedLines = (tank: WholeTank): readonly string[] => {
  if (tank.weighed === null) return [];
  const runs = tank.runs.flatMap((run) => {
    if ('fault' in run || run.weighed === null) return [];
    const name = `<b>${escaped(run.name)}</b>`;
    const doubt = standsOut(run);
    const budget = budgetWords(run.weighed, REPORT_WRITING);
    const made = `${name}: ${escaped(efficiencyText(run.weighed))}${budget === '' ? '' : ` (${budget})`}`;
    return [doubt === null ? made : `${made}. <span class="alarm">Stands out</span>: ${escaped(doubt)}`];
  });
  return [`<b>Tank</b>: ${weighedSentence(tank.weighed, REPORT_WRITING)}`, ...runs];
};

const recordLines = (tank: WholeTank): readonly string[] =>
  tank.runs.flatMap((run) => {
    if ('fault' in run || run.record === null) return [];
    const remarks = run.record.remarks.map((remark) => `<span class="basis">${escaped(remark)}</span>`);
    return [[`<b>${escaped(run.name)}</b>: ${recordSentence(run.record, REPORT_WRITING)}`, ...remarks].join('<br>')];
  });

const targetLines = ({ targets }: WholeTank): readonly string[] =>
  targets.flatMap((target) => ('fault' in target ? [] : [targetSentence(target, REPORT_WRITING)]));

const gasLines = ({ gas }: WholeTank): readonly string[] =>
  gas.map((one) => `${capital(gasSentence(one, REPORT_WRITING))}.`);

const noteLines = (tank: WholeTank): readonly string[] => {
  const present = tank.present.map(formulaHtml).join(', ');
  return [
    ...(present === '' ? [] : [`There, and taking no part: ${present}.`]),
    ...tankNotes(tank).map((note) => escaped(capital(note))),
    ...writtenNotes(tank).map(escaped),
  ];
};

const isFault = (part: RunAnswer | WholeTank['targets'][number]): part is Extract<RunAnswer, { fault: unknown }> =>
  'fault' in part;

/** One tank of the report: what runs there and what came of it, beside its pictures. `at` numbers its elements. */
export const tankSection = (tank: WholeTank, at: number, sheetText: string): string => {
  const id = `tank${String(at + 1)}`;
  const purpose = tank.purpose === null ? '' : `<p class="purpose">${escaped(tank.purpose)}</p>`;
  const broken = [...tank.runs, ...tank.targets, ...('fault' in tank.yield ? [tank.yield] : [])].filter(isFault);
  const left = [
    saidList('Goals', targetLines(tank)),
    saidList('Current efficiency by weighing', weighedLines(tank)),
    broken.map(({ name, fault }) => faultHtml(name, fault, sheetText)).join(''),
    saidList('Notes', noteLines(tank)),
  ];
  const right = [recordFigures(tank), saidList('Records', recordLines(tank)), saidList('Gas', gasLines(tank))];
  return [
    `<section class="tank" aria-labelledby="${id}"><h2 id="${id}">${escaped(tank.name)}</h2>${purpose}`,
    halves(reactionTable(tank), bandFigure(tank)),
    runsTable(tank),
    halves(left.join(''), right.join('')),
    '</section>',
  ]
    .filter((part) => part !== '')
    .join('\n');
};

/** Two columns side by side, one below the other on a narrow page; what is empty takes no room. */
const halves = (left: string, right: string): string => {
  const both = [left, right].filter((one) => one !== '').map((one) => `<div>${one}</div>`);
  return both.length === 0 ? '' : `<div class="halves">${both.join('')}</div>`;
};
