import { describe, expect, it } from 'vitest';
import { displayWidth, excerpt, printable } from '../../src/report/excerpt.ts';

const unknownElement = {
  code: 'unknown-element',
  field: 'skeleton',
  message: 'no element has the symbol Xx.',
  hint: 'Did you mean Xe?',
} as const;

describe('an excerpt', () => {
  it('shows place, text, carets, sentence and hint', () => {
    const fault = { ...unknownElement, span: { from: 8, to: 10 } };
    expect(excerpt(fault, 'Fe^2+ + Xx -> Fe^3+').split('\n')).toEqual([
      'skeleton:1:9',
      '  Fe^2+ + Xx -> Fe^3+',
      '          ^^ no element has the symbol Xx.',
      '  Did you mean Xe?',
    ]);
  });

  it('points under wide and combining characters by the columns they take', () => {
    const fault = { ...unknownElement, span: { from: 4, to: 6 } };
    // Two wide ideographs take four columns, e with a combining accent one: code points 0 to 3.
    expect(excerpt(fault, '銅鉄e\u0301Xx').split('\n')[2]).toBe('       ^^ no element has the symbol Xx.');
  });

  it('counts lines and columns from 1 in a text of several lines', () => {
    const fault = { ...unknownElement, span: { from: 7, to: 9 } };
    expect(excerpt(fault, 'Fe -> \nXx\n').split('\n').slice(0, 3)).toEqual([
      'skeleton:2:1',
      '  Xx',
      '  ^^ no element has the symbol Xx.',
    ]);
  });

  it('points behind the end of a text, and into an empty one', () => {
    const end = { ...unknownElement, span: { from: 2, to: 2 } };
    expect(excerpt(end, 'Fe').split('\n')[2]).toBe('    ^ no element has the symbol Xx.');
    expect(excerpt({ ...end, span: { from: 0, to: 0 } }, '').split('\n')[2]).toBe('  ^ no element has the symbol Xx.');
  });

  it('shows a long text around the place only', () => {
    const text = `${'H2 + '.repeat(2000)}Xx${' + H2'.repeat(2000)}`;
    const lines = excerpt({ ...unknownElement, span: { from: 10_000, to: 10_002 } }, text).split('\n');
    expect(lines[0]).toBe('skeleton:1:10001');
    expect(lines[1]?.length).toBeLessThan(100);
    const at = lines[2]?.indexOf('^') ?? -1;
    expect(lines[1]?.slice(at, at + 2)).toBe('Xx');
  });

  it('says the field alone where there is no text', () => {
    expect(excerpt({ code: 'bad-ask', field: 'given', message: 'given is missing.' }, null)).toBe(
      'given\n  given is missing.',
    );
  });

  it('lets nothing through that moves the cursor', () => {
    const text = 'Fe\u001b[31m\u202e\u200b\u0007';
    const shown = excerpt({ ...unknownElement, message: text, span: { from: 0, to: 2 } }, text);
    expect(/[\p{Cc}\p{Cf}]/u.test(shown.replaceAll('\n', ''))).toBe(false);
    expect(printable(text)).toBe('Fe□[31m□□□');
  });

  it('measures text by the columns it takes', () => {
    expect(displayWidth('Fe³⁺')).toBe(4);
    expect(displayWidth('銅')).toBe(2);
    expect(displayWidth('e\u0301')).toBe(1);
  });
});
