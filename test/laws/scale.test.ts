import { describe, expect, it } from 'vitest';
import { answer } from '../../src/desk/answer.ts';
import { ONE, rationalFromText } from '../../src/exact/rational.ts';
import { styledReaction } from '../../src/render/spelling.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { readTable } from '../support/table.ts';

const rows = readTable('redox/half-reactions.tsv');

const mediumOf = (text: string): unknown => (/^[a-z-]*$/.test(text) ? text : { helpers: text.split(/,\s*/) });

const halfPer = (row: Readonly<Record<string, string>>, per: string): { plain: string; electrons: string } => {
  const { skeleton, medium = '' } = row;
  const given = answer({ ask: 'half', skeleton, medium: mediumOf(medium), per });
  if (!given.ok || given.ask !== 'half') throw new Error(`${String(skeleton)}: ${JSON.stringify(given)}`);
  return { plain: given.answer.reaction.plain, electrons: given.answer.electrons };
};

describe('a half-reaction at another scale', () => {
  it.each(rows)('still conserves, counted by another reader: $skeleton in $medium', (row) => {
    const perElectron = halfPer(row, 'electron');
    expect(perElectron.electrons).toBe('1');
    const { left, right: made } = plainEquation(perElectron.plain);
    const electron = [...left, ...made].find(({ species }) => species.key === 'e^-');
    expect(electron?.coefficient.equals(ONE)).toBe(true);
    expect(residualByHand(perElectron.plain)).toEqual(new Map());

    const product = (row['reaction'] ?? '').split(' -> ')[1]?.split(' + ')[0]?.replace(/^\d+ /, '') ?? '';
    const perProduct = halfPer(row, product);
    expect(residualByHand(perProduct.plain)).toEqual(new Map());
    // The ratio of electrons to product is that of the published line.
    const { right } = plainEquation(row['reaction'] ?? '');
    const published = rationalFromText(row['electrons'] ?? '0').div(right[0]?.coefficient ?? ONE);
    expect(rationalFromText(perProduct.electrons).equals(published)).toBe(true);
  });

  it.each(rows)('is spelled in every style with every digit: $reaction', ({ reaction = '' }) => {
    const digits = (text: string): string => text.replaceAll(/[^\d]/g, '');
    const html = styledReaction(reaction, 'html').replaceAll(/<[^>]*>/g, '');
    expect(digits(html)).toBe(digits(reaction));
    const latex = styledReaction(reaction, 'latex');
    expect(digits(latex)).toBe(digits(reaction));
    expect(latex.split('\\rightarrow')).toHaveLength(2);
    const lowered = '₀₁₂₃₄₅₆₇₈₉';
    const raised = '⁰¹²³⁴⁵⁶⁷⁸⁹';
    const unicode = styledReaction(reaction, 'unicode').replaceAll(/[₀-₉⁰¹²³⁴-⁹]/g, (digit) =>
      String(Math.max(lowered.indexOf(digit), raised.indexOf(digit))),
    );
    expect(digits(unicode)).toBe(digits(reaction));
  });
});
