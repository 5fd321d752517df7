import { describe, expect, it } from 'vitest';
import { didYouMean, editDistance, nearest } from '../../src/report/suggest.ts';

describe('edit distance', () => {
  it.each([
    ['', '', 0],
    ['', 'abc', 3],
    ['acid', 'acid', 0],
    ['acid', 'aicd', 1],
    ['medum', 'medium', 1],
    ['kitten', 'sitting', 3],
    ['Cl', 'CL', 1],
  ])('takes %j to %j in %i edits', (a, b, edits) => {
    expect(editDistance(a, b)).toBe(edits);
    expect(editDistance(b, a)).toBe(edits);
  });
});

describe('suggestions', () => {
  it('puts the same letters in another case first', () => {
    expect(nearest('MNO4^-', ['Mn2O4', 'MnO4^-'])).toEqual(['MnO4^-']);
  });

  it('keeps the order of the candidates among equals and stops at the limit', () => {
    expect(nearest('xa', ['a', 'b', 'xb', 'xc', 'xd'], 1, 2)).toEqual(['a', 'xb']);
  });

  it('says nothing where nothing is near', () => {
    expect(nearest('skeleton', ['medium'])).toEqual([]);
    expect(didYouMean([])).toBeUndefined();
  });

  it('asks in one sentence', () => {
    expect(didYouMean(['Xe'])).toBe('Did you mean Xe?');
    expect(didYouMean(['Zn', 'Zr', 'In'])).toBe('Did you mean Zn, Zr or In?');
  });
});
