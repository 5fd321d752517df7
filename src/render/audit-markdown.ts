import type { Answered, CellAuditAnswer, EquationAuditAnswer } from '../desk/schema/answer.ts';
import type { ShownNote } from '../desk/schema/shape.ts';
import type { Subject } from './answer.ts';
import { CELL_PARTS, VERDICTS, amountText, signedText } from './audit-words.ts';

type Repair = EquationAuditAnswer['repairs'][number];

/** Code as Markdown takes it, also where the text itself holds a backtick. */
const code = (text: string): string => {
  const fence = text.includes('`') ? '``' : '`';
  return `${fence}${text.replaceAll('\n', ' ').replaceAll('|', '\\|')}${fence}`;
};

const row = (cells: readonly string[]): string => `| ${cells.join(' | ')} |`;

/** The ledger as a table: a line for each term where that was asked for, then both sides and what is off. */
const ledgerTable = ({ ledger, residual, contributions = [] }: EquationAuditAnswer): readonly string[] => {
  const labels = Object.keys(ledger);
  const side = (at: 0 | 1): readonly string[] => labels.map((label) => amountText(label, ledger[label]?.[at] ?? '0'));
  const off = labels.map((label) => (residual[label] === undefined ? '' : `**${signedText(residual[label])}**`));
  return [
    row(['', ...labels]),
    row(['---', ...labels.map(() => '--:')]),
    ...contributions.map(({ term, side: stands, amounts }) =>
      row([`${code(term)} (${stands})`, ...labels.map((label) => amountText(label, amounts[label] ?? ''))]),
    ),
    row(['left', ...side(0)]),
    row(['right', ...side(1)]),
    ...(Object.keys(residual).length === 0 ? [] : [row(['off by', ...off])]),
  ];
};

const repairItem = ({ reaction, edits, improbable }: Repair, at: number): string => {
  const doubt = improbable === true ? ' (improbable)' : '';
  return `${String(at + 1)}. ${code(reaction.plain)}${doubt}: ${edits.map(({ text }) => text).join('; ')}`;
};

const section = (heading: string, items: readonly string[]): readonly string[] =>
  items.length === 0 ? [] : ['', heading, '', ...items];

const equationSection = (audit: EquationAuditAnswer, equation: string): readonly string[] => [
  `${equation === '' ? '' : `${code(equation)}: `}**${VERDICTS[audit.verdict].words}**`,
  '',
  ...ledgerTable(audit),
  ...section('Repairs, the likeliest first:', audit.repairs.map(repairItem)),
];

const cellSections = (audit: CellAuditAnswer, subject: Subject): readonly string[] => {
  const { electrons, multipliers, failed, electronsPerMole } = audit;
  const taken =
    multipliers === undefined ? [] : [`- taken: ${multipliers.anode} x anode, ${multipliers.cathode} x cathode`];
  const claimed = electrons.claimed === null ? '' : `, claimed ${electrons.claimed}`;
  const products = Object.entries(electronsPerMole).map(
    ([species, each]) => `- ${code(species)}: ${each} mol of electrons per mole`,
  );
  return [
    ...CELL_PARTS.flatMap((part) => [
      `### ${part}`,
      '',
      ...equationSection(audit.parts[part], subject.parts?.[part] ?? ''),
      '',
    ]),
    '### cell',
    '',
    `**${failed.length === 0 ? 'nothing fails' : `fails: ${failed.join(', ')}`}**`,
    '',
    ...taken,
    `- electrons: ${electrons.found ?? 'not found'}${claimed}`,
    ...products,
  ];
};

const noteItems = (notes: readonly ShownNote[]): readonly string[] => notes.map(({ message }) => `- ${message}`);

/** The audit of one equation or of a whole cell as Markdown, to be pasted into a report. */
export const auditMarkdown = (given: Answered & { readonly ask: 'audit' }, subject: Subject): string => {
  const { answer, notes } = given;
  const lines = 'parts' in answer ? cellSections(answer, subject) : equationSection(answer, subject.text);
  return `${[...lines, ...section('Notes:', noteItems(notes))].join('\n')}\n`;
};
