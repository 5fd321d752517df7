import type { CellAuditAnswer, EquationAuditAnswer } from '../desk/schema/answer.ts';
import { CELL_PARTS, type CellPart, VERDICTS } from './audit-words.ts';
import { hanging, labelled } from './block.ts';
import { type Cell, columns } from './columns.ts';
import { contributionLines } from './contributions.ts';
import { ledgerLines } from './ledger.ts';
import type { Look } from './look.ts';
import { speciesText, termText } from './spelling.ts';

type Blocks = readonly (readonly string[])[];
type Repair = EquationAuditAnswer['repairs'][number];

/** The equations of a whole cell as they were written. */
export type WrittenParts = Readonly<Partial<Record<CellPart, string>>>;

const verdictCell = (verdict: EquationAuditAnswer['verdict'], look: Look): Cell => {
  const { words, paint } = VERDICTS[verdict];
  return { text: words, paint: look.paint[paint] };
};

/** A repaired equation with the terms that were edited marked: by their species, or by the one it was mistyped for. */
export const repaired = (repair: Repair, look: Look): string => {
  const edited = new Set(repair.edits.flatMap(({ term, to }) => [term, to]));
  return repair.reaction.plain
    .split(/( \+ | -> )/)
    .map((piece) => {
      if (piece === ' -> ') return look.unicode ? ' → ' : piece;
      if (piece === ' + ') return piece;
      const text = termText(piece, look);
      return edited.has(piece.replace(/^[\d./]+ /, '')) ? look.paint.mark(text) : text;
    })
    .join('');
};

const repairLines = (repair: Repair, at: number, look: Look): readonly string[] => {
  const doubt = repair.improbable === true ? look.paint.warn('  (improbable)') : '';
  const first = `${`repair ${String(at + 1)}`.padEnd(10)}  ${repaired(repair, look)}${doubt}`;
  return [first, ...repair.edits.flatMap((edit) => hanging('', edit.text, look.paint.faint))];
};

/** What is shown of an equation below its verdict: what each term puts in where asked for, ledger, repairs. */
const groundsOf = (audit: EquationAuditAnswer, look: Look): Blocks => [
  contributionLines(audit, look),
  ledgerLines(audit.ledger, look, audit.residual),
  ...audit.repairs.map((repair, at) => repairLines(repair, at, look)),
];

/** The verdict on one equation, its ledger and its repairs, the likeliest first. */
export const equationAuditBlocks = (audit: EquationAuditAnswer, equation: string, look: Look): Blocks => [
  [look.paint.strong(equation)],
  labelled([['verdict', verdictCell(audit.verdict, look)]], look),
  ...groundsOf(audit, look),
];

const partRows = (
  { parts, failed }: CellAuditAnswer,
  written: WrittenParts,
  look: Look,
): readonly (readonly (Cell | string)[])[] =>
  CELL_PARTS.map((part) => {
    // an equation may balance and still be no sum of the two others
    const fits = failed.includes(part) && parts[part].verdict === 'balanced';
    return [
      { text: part.padEnd(10), paint: look.paint.faint },
      { text: written[part] ?? '', paint: look.paint.strong },
      fits ? { text: 'balanced, but does not fit', paint: look.paint.bad } : verdictCell(parts[part].verdict, look),
    ];
  });

const perMoleRows = ({ electronsPerMole }: CellAuditAnswer, look: Look): readonly (readonly (Cell | string)[])[] =>
  Object.entries(electronsPerMole).map(([species, electrons], at) => [
    { text: (at === 0 ? 'makes' : '').padEnd(10), paint: look.paint.faint },
    speciesText(species, look),
    electrons,
    { text: 'mol of electrons per mole', paint: look.paint.faint },
  ]);

const takenText = ({ anode, cathode }: NonNullable<CellAuditAnswer['multipliers']>, look: Look): string => {
  const times = look.unicode ? '×' : 'x';
  return `${anode} ${times} anode, ${cathode} ${times} cathode`;
};

const needsGrounds = (audit: EquationAuditAnswer): boolean =>
  audit.verdict !== 'balanced' || audit.contributions !== undefined;

/** The verdicts on the lines of a whole cell, which of its claims fail, and what the cell makes for each electron. */
export const cellAuditBlocks = (audit: CellAuditAnswer, written: WrittenParts, look: Look): Blocks => {
  const { parts, multipliers, electrons, failed } = audit;
  const wrong = failed.includes('electrons') ? look.paint.bad : (text: string) => text;
  const claimed = electrons.claimed === null ? '' : `, claimed ${electrons.claimed}`;
  const numbers: readonly (readonly [string, Cell | string])[] = [
    ...(multipliers === undefined ? [] : [['taken', takenText(multipliers, look)] as const]),
    ['electrons', { text: `${electrons.found ?? 'not found'}${claimed}`, paint: wrong }],
    [
      'fails',
      failed.length === 0
        ? { text: 'nothing', paint: look.paint.good }
        : { text: failed.join(', '), paint: look.paint.bad },
    ],
  ];
  return [
    columns(partRows(audit, written, look), ['left', 'left', 'left']),
    labelled(numbers, look),
    columns(perMoleRows(audit, look), ['left', 'left', 'right', 'left']),
    ...CELL_PARTS.filter((part) => needsGrounds(parts[part])).flatMap((part) => [
      [look.paint.strong(part)],
      ...groundsOf(parts[part], look),
    ]),
  ];
};
