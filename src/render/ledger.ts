import type { ShownLedger } from '../desk/schema/shape.ts';
import { type Alignment, type Cell, columns } from './columns.ts';
import type { Look } from './look.ts';
import { numberText } from './spelling.ts';

const LABEL = 10;

const signed = (text: string): string => (/^[1-9]/.test(text) ? `+${text}` : text);

/** A number of the ledger; a charge carries its sign. */
const entry = (label: string, text: string, look: Look): string =>
  numberText(label === 'charge' ? signed(text) : text, look);

const nothing = (look: Look): string => (look.unicode ? '·' : '.');

/**
 * A ledger with one column for each element and the charge:
 *
 *                 H   O   charge
 *     left        4   2        0
 *     right       4   1        0
 *     off by      .  -1        .
 *
 * `residual` (right minus left, zeros left out) adds the last line.
 */
export const ledgerLines = (
  ledger: ShownLedger,
  look: Look,
  residual?: Readonly<Record<string, string>>,
): readonly string[] => {
  const labels = Object.keys(ledger);
  const { faint, bad } = look.paint;
  const named = (label: string): Cell => ({ text: label.padEnd(LABEL), paint: faint });
  const side = (at: 0 | 1): readonly string[] => labels.map((label) => entry(label, ledger[label]?.[at] ?? '0', look));
  const gap = labels.map((label): Cell => {
    const off = residual?.[label];
    return off === undefined
      ? { text: nothing(look), paint: faint }
      : { text: numberText(signed(off), look), paint: bad };
  });
  const rows: readonly (readonly (Cell | string)[])[] = [
    [named(''), ...labels.map((label): Cell => ({ text: label, paint: faint }))],
    [named('left'), ...side(0)],
    [named('right'), ...side(1)],
    ...(residual === undefined || Object.keys(residual).length === 0 ? [] : [[named('off by'), ...gap]]),
  ];
  return columns(rows, ['left', ...labels.map((): Alignment => 'right')]);
};
