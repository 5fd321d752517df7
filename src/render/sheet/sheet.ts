import { ABSENCE } from '../../caution/cautions.ts';
import type { CellAnswer } from '../../desk/schema/answer.ts';
import type { SheetAnswer, SheetCaution, WholeTank } from '../../desk/sheet/answer.ts';
import { productsOf } from '../../desk/sheet/products.ts';
import { hanging, labelled, page, wrapped } from '../block.ts';
import { type Cell, columns, indented } from '../columns.ts';
import type { Look } from '../look.ts';
import { halfRows } from '../reactions.ts';
import { graveOf, makesGas, othersOf } from './cautions.ts';
import { tankNotes, writtenNotes } from './notes.ts';
import { runTable, standsOut } from './table.ts';
import {
  GAS_BASIS,
  type Writing,
  gasSentence,
  recordSentence,
  targetSentence,
  totalRows,
  weighedSentence,
} from './words.ts';
import { reactionText, speciesText } from '../spelling.ts';
import { printable } from '../../report/excerpt.ts';

const asIs = (text: string): string => text;

/** Names of the sheet cannot move the cursor; what is doubtful is painted by the line, so that lines can be broken. */
const writingFor = (look: Look): Writing => ({
  text: printable,
  species: (plain) => speciesText(plain, look),
  alarm: asIs,
});

const reactionLines = (cell: CellAnswer, look: Look): readonly string[] =>
  columns(
    [
      ...halfRows('anode', cell.anode, look),
      ...halfRows('cathode', cell.cathode, look),
      [
        { text: 'overall', paint: look.paint.faint },
        '',
        { text: reactionText(cell.overall.plain, look), paint: look.paint.strong },
      ],
    ],
    ['left', 'right', 'left'],
  );

const electronLines = (tank: WholeTank, look: Look): readonly string[] => {
  const { overall, electrons } = tank.cell.answer;
  const perMole = 'fault' in tank.yield ? {} : tank.yield.answer.electronsPerMole;
  const told = productsOf(overall, tank.product).flatMap((species) =>
    perMole[species] === undefined ? [] : [`${perMole[species]} per mole of ${speciesText(species, look)}`],
  );
  const [first, ...rest] = told;
  const each = first === undefined ? '' : `   ${[first, ...rest.map((one) => one.replace(' mole of', ''))].join(', ')}`;
  return labelled([['electrons', `${electrons}${each}`]], look);
};

/** The runs of a tank: charge, efficiency, and what each makes of every product. */
const runLines = (tank: WholeTank, look: Look): readonly string[] => {
  const table = runTable(tank);
  if (table === null) return [];
  const faint = (text: string): Cell => ({ text, paint: look.paint.faint });
  const names = table.columns.map(({ heading, isSpecies }) => (isSpecies ? speciesText(heading, look) : heading));
  const head = ['run', ...names].map(faint);
  const units = ['', ...table.columns.map(({ unit }) => unit)].map(faint);
  const rows = table.rows.map(({ run, cells }) => {
    const name = printable(run.name);
    return [standsOut(run) === null ? name : { text: `! ${name}`, paint: look.paint.bad }, ...cells];
  });
  return columns([head, units, ...rows], ['left', ...names.map(() => 'right' as const)]);
};

/** What came of the runs and goals, one line each behind its label. */
const outcomeLines = (tank: WholeTank, look: Look): readonly string[] => {
  const write = writingFor(look);
  const runs = tank.runs.flatMap((run) => ('fault' in run ? [] : [run]));
  const weighed =
    tank.weighed === null ? [] : hanging('weighed', weighedSentence(tank.weighed, write), asIs, look.paint.faint);
  const out = runs.flatMap((run) => {
    const why = standsOut(run);
    return why === null ? [] : hanging('', `${printable(run.name)} stands out: ${why}`, look.paint.bad);
  });
  const goals = tank.targets.flatMap((target) => {
    if ('fault' in target) return [];
    return hanging(
      'goal',
      targetSentence(target, write),
      target.reached === false ? look.paint.bad : asIs,
      look.paint.faint,
    );
  });
  const records = runs.flatMap(({ name, record }) => {
    if (record === null) return [];
    const remarks = record.remarks.flatMap((remark) => hanging('', printable(remark), look.paint.warn));
    return [
      ...hanging('record', `${printable(name)}: ${recordSentence(record, write)}`, asIs, look.paint.faint),
      ...remarks,
    ];
  });
  const gas = tank.gas.flatMap((one) => hanging('gas', gasSentence(one, write), asIs, look.paint.faint));
  const notes = [...tankNotes(tank), ...writtenNotes(tank)].flatMap((note) =>
    hanging('note', printable(note), look.paint.warn, look.paint.faint),
  );
  return [...weighed, ...out, ...goals, ...records, ...gas, ...presentLines(tank, look), ...notes];
};

const presentLines = ({ present }: WholeTank, look: Look): readonly string[] =>
  present.length === 0
    ? []
    : hanging(
        'present',
        `${present.map((species) => speciesText(printable(species), look)).join(', ')}, taking no part`,
        asIs,
      );

/** A tank as a page of its own; its faults are shown elsewhere. */
export const renderTank = (tank: WholeTank, look: Look): string => {
  const purpose = tank.purpose === null ? '' : `   ${printable(tank.purpose)}`;
  return `${look.paint.strong(printable(tank.name))}${purpose}\n${page([
    [...reactionLines(tank.cell.answer, look), ...electronLines(tank, look)],
    runLines(tank, look),
    outcomeLines(tank, look),
  ])}`;
};

/** Columns of the cautions. */
const WIDE = 76;

const cautionLines = (caution: SheetCaution, look: Look, paint: (text: string) => string): readonly string[] => {
  const because = caution.because.map((species) => speciesText(species, look)).join(', ');
  const basis = [because, caution.basis].filter((part) => part !== '').join('; ');
  return wrapped(`${caution.tanks.map(printable).join(', ')}: ${caution.text} (${basis})`, WIDE).map((line, at) =>
    paint(at === 0 ? line : `  ${line}`),
  );
};

/** The heading of a sheet, and the cautions that come before everything else. */
export const renderHead = (sheet: SheetAnswer, look: Look): string => {
  const about = sheet.about === null ? [] : wrapped(printable(sheet.about)).map(look.paint.faint);
  const grave = graveOf(sheet).flatMap((caution) => cautionLines(caution, look, look.paint.bad));
  const first = grave.length === 0 ? [] : ['', look.paint.strong('Read first'), ...indented(grave)];
  return `${[look.paint.strong(printable(sheet.plant)), ...about, ...first].join('\n')}\n`;
};

/** What the whole plant came to. */
export const renderTotals = ({ totals }: SheetAnswer, look: Look): string => {
  if (totals.runs === 0) return '';
  const rows = totalRows(totals, writingFor(look));
  const isFlow = ({ name }: (typeof rows)[number]): boolean => name === 'charge' || name === 'energy';
  const flows = rows
    .filter(isFlow)
    .map(({ name, value, aside }) => [name, aside === '' ? value : `${value}, ${aside}`] as const);
  const made = rows.filter((row) => !isFlow(row)).map(({ name, value }) => `${name} ${value}`);
  const products = made.length === 0 ? [] : hanging('made', made.join(';  '), asIs, look.paint.faint);
  return `${look.paint.strong('Altogether')}\n${page([[...labelled(flows, look), ...products]])}`;
};

/** The first sentence of a caution that may apply: the other formats show it whole. */
const firstSentence = (says: string): string => says.split(/(?<=\.) (?=[A-Z])/)[0] ?? says;

/** A condition on the left, what may happen behind it. */
const conditionLines = ({ says, when, tanks, basis }: SheetCaution, look: Look): readonly string[] =>
  wrapped(`${when ?? ''}: ${firstSentence(says)} (${tanks.map(printable).join(', ')}; ${basis})`, WIDE).map(
    (line, at) => (at === 0 ? `${look.paint.strong(when ?? '')}${line.slice((when ?? '').length)}` : `  ${line}`),
  );

/** The cautions that are left: those that hold, then in short those of which only the reader knows whether they do. */
export const renderCautions = (sheet: SheetAnswer, look: Look): string => {
  const others = othersOf(sheet);
  const holding = others.filter(({ when }) => when === null).flatMap((caution) => cautionLines(caution, look, asIs));
  const open = others.filter(({ when }) => when !== null).flatMap((caution) => conditionLines(caution, look));
  const short = open.length === 0 ? [] : [look.paint.faint('In short, where it applies:'), ...open];
  const gas = makesGas(sheet) ? wrapped(GAS_BASIS, WIDE) : [];
  const last = [...gas, ...wrapped(ABSENCE, WIDE)].map(look.paint.faint);
  return `${look.paint.strong('Cautions')}\n${indented([...holding, ...short, ...last]).join('\n')}\n`;
};

/** Said in the place of a part that is at fault; the fault itself is shown elsewhere. */
export const renderUnanswered = (name: string, look: Look): string =>
  `${look.paint.bad(`! ${printable(name)} was not answered.`)}\n`;

/** The last line of a sheet. */
export const renderFoot = ({ plant, invented }: SheetAnswer): string =>
  invented ? `${printable(plant)} and all its figures are invented.\n` : '';
