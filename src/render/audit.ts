import type { CellAuditAnswer, EquationAuditAnswer } from '../desk/schema/answer.ts';
import { hanging, labelled } from './block.ts';
import { ledgerLines } from './ledger.ts';
import type { Look, Paint } from './look.ts';
import { termText } from './spelling.ts';

type Blocks = readonly (readonly string[])[];
type Repair = EquationAuditAnswer['repairs'][number];

const VERDICTS = {
  balanced: { words: 'balanced', paint: 'good' },
  'not-lowest': { words: 'balanced, not in lowest terms', paint: 'warn' },
  unbalanced: { words: 'not balanced', paint: 'bad' },
} as const satisfies Readonly<Record<string, { readonly words: string; readonly paint: keyof Paint }>>;

/** A verdict in words, painted by what it means. */
export const verdictText = (verdict: EquationAuditAnswer['verdict'], look: Look): string => {
  const { words, paint } = VERDICTS[verdict];
  return look.paint[paint](words);
};

/** A repaired equation with the terms that were edited marked: by their species, or by the one it was mistyped for. */
const repaired = (repair: Repair, look: Look): string => {
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

/** The verdict on one equation, its ledger and its repairs, the likeliest first. */
export const equationAuditBlocks = (audit: EquationAuditAnswer, equation: string, look: Look): Blocks => [
  [look.paint.strong(equation)],
  labelled([['verdict', { text: audit.verdict, paint: () => verdictText(audit.verdict, look) }]], look),
  ledgerLines(audit.ledger, look, audit.residual),
  ...audit.repairs.map((repair, at) => repairLines(repair, at, look)),
];

/** The verdicts on the lines of a whole cell, and which of its claims fail. */
export const cellAuditBlocks = (audit: CellAuditAnswer, look: Look): Blocks => {
  const { parts, multipliers, electrons, failed } = audit;
  const verdicts = (['anode', 'cathode', 'overall'] as const).map(
    (part) => [part, { text: parts[part].verdict, paint: () => verdictText(parts[part].verdict, look) }] as const,
  );
  const numbers: readonly (readonly [string, string])[] = [
    ...(multipliers === undefined
      ? []
      : [['taken', `anode ${multipliers.anode}, cathode ${multipliers.cathode}`] as const]),
    ['electrons', `claimed ${electrons.claimed ?? '-'}, found ${electrons.found ?? '-'}`],
  ];
  const fails = failed.length === 0 ? look.paint.good('nothing') : look.paint.bad(failed.join(', '));
  const repairs = (['anode', 'cathode', 'overall'] as const).flatMap((part) =>
    parts[part].verdict === 'balanced'
      ? []
      : [
          [look.paint.strong(part), ...ledgerLines(parts[part].ledger, look, parts[part].residual)],
          ...parts[part].repairs.map((repair, at) => repairLines(repair, at, look)),
        ],
  );
  return [labelled(verdicts, look), labelled([...numbers, ['fails', fails]], look), ...repairs];
};
