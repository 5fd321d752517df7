/** Which sign stands before the decimals; null until a number shows it. */
export type DecimalSign = 'point' | 'comma' | null;

/** Why a field is no number. */
export type NumberProblem = 'missing-value' | 'not-a-number' | 'decimal-sign';

const PLAIN = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;
const COMMA = /^[+-]?(?:\d+,?\d*|,\d+)(?:[eE][+-]?\d+)?$/;
const GROUPED_POINT = /^[+-]?\d{1,3}(?:,\d{3})+\.\d+$/;
const GROUPED_COMMA = /^[+-]?\d{1,3}(?:\.\d{3})+,\d+$/;

const ABSURD = 1e30;

/**
 * Reads the numbers of one record. A record has one decimal sign, shown by the first number that has one; a number with
 * the other is refused, because 1,250 may then be more than a thousand.
 */
export class RecordNumbers {
  sign: DecimalSign;

  constructor(sign: DecimalSign) {
    this.sign = sign;
  }

  /** The number of a field, or why it is none. A size that no current and no time has is none either: 1e999. */
  read(field: string): number | NumberProblem {
    const read = this.written(field);
    return typeof read === 'string' || Math.abs(read) < ABSURD ? read : 'not-a-number';
  }

  private written(field: string): number | NumberProblem {
    if (this.sign === 'comma' && COMMA.test(field)) return Number(field.replace(',', '.'));
    if (PLAIN.test(field)) return field.includes('.') && !this.agree('point') ? 'decimal-sign' : Number(field);
    const text = field.trim().replace(/^[−–]/, '-');
    if (text === '') return 'missing-value';
    if (PLAIN.test(text)) return this.written(text);
    if (COMMA.test(text)) return this.agree('comma') ? Number(text.replace(',', '.')) : 'decimal-sign';
    if (GROUPED_POINT.test(text)) return this.agree('point') ? Number(text.replaceAll(',', '')) : 'decimal-sign';
    if (!GROUPED_COMMA.test(text)) return 'not-a-number';
    return this.agree('comma') ? Number(text.replaceAll('.', '').replace(',', '.')) : 'decimal-sign';
  }

  private agree(sign: 'point' | 'comma'): boolean {
    this.sign ??= sign;
    return this.sign === sign;
  }
}
