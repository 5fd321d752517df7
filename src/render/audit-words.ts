import type { EquationAuditAnswer } from '../desk/schema/answer.ts';
import type { Paint } from './look.ts';

/** The parts of a whole cell, in the order in which they are shown. */
export const CELL_PARTS = ['anode', 'cathode', 'overall'] as const;
export type CellPart = (typeof CELL_PARTS)[number];

/** A verdict in words, and how it is painted. */
export const VERDICTS = {
  balanced: { words: 'balanced', paint: 'good' },
  'not-lowest': { words: 'balanced, not in lowest terms', paint: 'warn' },
  unbalanced: { words: 'not balanced', paint: 'bad' },
} as const satisfies Readonly<
  Record<EquationAuditAnswer['verdict'], { readonly words: string; readonly paint: keyof Paint }>
>;

/** "+2", "-1", "0": a number that carries its sign. */
export const signedText = (text: string): string => (/^[1-9]/.test(text) ? `+${text}` : text);

/** What a label of a ledger says of an amount: a charge carries its sign. */
export const amountText = (label: string, amount: string): string => (label === 'charge' ? signedText(amount) : amount);
