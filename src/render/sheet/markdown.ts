import { ABSENCE } from '../../caution/cautions.ts';
import type { ShownScaledHalf } from '../../desk/schema/shape.ts';
import { excerpt } from '../../report/excerpt.ts';
import type { SheetAnswer, SheetCaution, SheetFault, TankAnswer, WholeTank } from '../../desk/sheet/answer.ts';
import { UNPAINTED } from '../look.ts';
import { graveOf, makesGas, othersOf } from './cautions.ts';
import { tankNotes, writtenNotes } from './notes.ts';
import { runTable } from './table.ts';
import {
  GAS_BASIS,
  type Writing,
  budgetWords,
  efficiencyText,
  gasSentence,
  recordSentence,
  targetSentence,
  totalRows,
  weighedSentence,
} from './words.ts';
import { reactionText, speciesText } from '../spelling.ts';

const LOOK = { unicode: true, paint: UNPAINTED };

/** A text of the sheet with what Markdown keeps for itself behind a backslash, on one line. */
const plain = (text: string): string => text.replace(/\s+/g, ' ').replace(/[\\`*_{}[\]<>#|~!&]/g, '\\$&');

const WRITING: Writing = {
  text: plain,
  species: (species) => plain(speciesText(species, LOOK)),
  alarm: (written) => `**${written}**`,
};

const table = (head: readonly string[], rows: readonly (readonly string[])[]): readonly string[] => [
  `| ${head.join(' | ')} |`,
  `| ${head.map((_, at) => (at === 0 ? '---' : '---:')).join(' | ')} |`,
  ...rows.map((row) => `| ${row.join(' | ')} |`),
];

const cautionLine = (caution: SheetCaution): string => {
  const basis = [caution.because.map(WRITING.species).join(', '), plain(caution.basis)].filter((part) => part !== '');
  return `- **${caution.tanks.map(plain).join(', ')}.** ${plain(caution.text)} (${basis.join('; ')})`;
};

const listed = (heading: string, lines: readonly string[]): readonly string[] =>
  lines.length === 0 ? [] : ['', `**${heading}**`, '', ...lines.map((line) => `- ${line}`)];

const halfRow = (name: string, half: ShownScaledHalf): readonly string[] => [
  name,
  half.multiplier ?? '',
  plain(reactionText(half.reaction.plain, LOOK)),
];

const reactions = ({ cell: { answer: cell } }: WholeTank): readonly string[] => [
  '| electrode | times | reaction |',
  '| --- | ---: | --- |',
  ...[
    ...cell.anode.map((half) => halfRow('anode', half)),
    ...cell.cathode.map((half) => halfRow('cathode', half)),
    ['overall', '', plain(reactionText(cell.overall.plain, LOOK))],
  ].map((row) => `| ${row.join(' | ')} |`),
  '',
  `${cell.electrons} electrons in the overall reaction.`,
];

const runs = (tank: WholeTank): readonly string[] => {
  const found = runTable(tank);
  if (found === null) return [];
  const head = found.columns.map(
    ({ heading, isSpecies, unit }) => `${isSpecies ? WRITING.species(heading) : heading}, ${unit}`,
  );
  return [
    '',
    ...table(
      ['run', ...head],
      found.rows.map(({ run, cells }) => [plain(run.name), ...cells]),
    ),
  ];
};

const weighed = (tank: WholeTank): readonly string[] => {
  if (tank.weighed === null) return [];
  const each = tank.runs.flatMap((run) => {
    if ('fault' in run || run.weighed === null) return [];
    const budget = budgetWords(run.weighed, WRITING);
    const made = `${plain(run.name)}: ${efficiencyText(run.weighed)}${budget === '' ? '' : ` (${budget})`}`;
    return [run.weighed.standsOut === null ? made : `${made}. ${WRITING.alarm(run.weighed.standsOut)}`];
  });
  return [`Tank: ${weighedSentence(tank.weighed, WRITING)}`, ...each];
};

const records = (tank: WholeTank): readonly string[] =>
  tank.runs.flatMap((run) => {
    if ('fault' in run || run.record === null) return [];
    const record = `${plain(run.name)}: ${recordSentence(run.record, WRITING)}`;
    return [[record, ...run.record.remarks.map(plain)].join('; ')];
  });

const fault = ({ name, fault: found }: SheetFault, sheetText: string): readonly string[] => [
  '',
  WRITING.alarm(`${plain(name)} was not answered`),
  '',
  ...excerpt(found, sheetText)
    .split('\n')
    .map((line) => `    ${line}`),
];

const wholeTank = (tank: WholeTank, sheetText: string): readonly string[] => {
  const targets = tank.targets.flatMap((one) => ('fault' in one ? [] : [targetSentence(one, WRITING)]));
  const gas = tank.gas.map((one) => gasSentence(one, WRITING));
  const present =
    tank.present.length === 0 ? [] : [`there, and taking no part: ${tank.present.map(WRITING.species).join(', ')}`];
  const broken = [...tank.runs, ...tank.targets, tank.yield].filter((part): part is SheetFault => 'fault' in part);
  return [
    ...(tank.purpose === null ? [] : [plain(tank.purpose), '']),
    ...reactions(tank),
    ...runs(tank),
    ...listed('Goals', targets),
    ...listed('Current efficiency by weighing', weighed(tank)),
    ...listed('Records', records(tank)),
    ...listed('Gas', gas),
    ...listed('Notes', [...present, ...[...tankNotes(tank), ...writtenNotes(tank)].map(plain)]),
    ...broken.flatMap((one) => fault(one, sheetText)),
  ];
};

const tankLines = (tank: TankAnswer, sheetText: string): readonly string[] => [
  '',
  `## ${plain(tank.name)}`,
  '',
  ...('fault' in tank ? fault(tank, sheetText).slice(1) : wholeTank(tank, sheetText)),
];

const totals = (sheet: SheetAnswer): readonly string[] =>
  sheet.totals.runs === 0
    ? []
    : [
        '',
        '## Altogether',
        '',
        ...table(
          ['', 'sum', ''],
          totalRows(sheet.totals, WRITING).map(({ name, value, aside }) => [name, value, aside]),
        ),
      ];

/** A sheet's answers in Markdown, the grave cautions first. `sheetText` is shown where a part is at fault. */
export const sheetMarkdown = (sheet: SheetAnswer, sheetText: string): string => {
  const grave = graveOf(sheet);
  const others = othersOf(sheet);
  return `${[
    `# ${plain(sheet.plant)}`,
    ...(sheet.about === null ? [] : ['', plain(sheet.about)]),
    ...(sheet.invented ? ['', `${plain(sheet.plant)} and all its figures are invented.`] : []),
    ...(grave.length === 0 ? [] : ['', '## Read first', '', ...grave.map(cautionLine)]),
    ...sheet.tanks.flatMap((tank) => tankLines(tank, sheetText)),
    ...totals(sheet),
    '',
    '## Cautions',
    '',
    ...others.map(cautionLine),
    ...(others.length === 0 ? [] : ['']),
    ...(makesGas(sheet) ? [GAS_BASIS, ''] : []),
    ABSENCE,
  ].join('\n')}\n`;
};
