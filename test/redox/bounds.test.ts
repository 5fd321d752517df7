import { describe, expect, it } from 'vitest';
import { answer } from '../../src/desk/answer.ts';
import { residualOf } from '../../src/balance/recount.ts';
import { USUAL_BOUNDS } from '../../src/exact/bounds.ts';
import { MOST_SHOWN } from '../../src/redox/coupling/several.ts';
import { plainEquation } from '../support/plain.ts';

/** CH4, C2H6 and so on: `count` paraffins from the one of `from` carbon atoms on. */
const paraffins = (count: number, from = 1): readonly string[] =>
  Array.from({ length: count }, (_, at) => `C${String(at + from)}H${String(2 * (at + from) + 2)}`);

const faultOf = (ask: unknown): unknown => {
  const given = answer(ask);
  return given.ok ? given.answer : given.fault;
};

/** `count` compounds of a metal pair each, in the proportions of a fixed sequence: no two alike, no order to them. */
const alloys = (count: number): readonly string[] => {
  const metals = ['Mn', 'Fe', 'Cu', 'Zn', 'Ni', 'Co'];
  return Array.from({ length: count }, (_, at) => {
    const [one, other] = [metals[at % 6], metals[(at * at + 1 + (at % 5)) % 6]];
    return `${one ?? ''}${String(((at * 37) % 101) + 1)}${other ?? ''}2Au${String(((at * 53) % 97) + 1)}`;
  });
};

describe('the work on one ask', () => {
  it('shows the first members of a long family and says how many there are', () => {
    const fault = faultOf({ ask: 'half', skeleton: `${paraffins(MOST_SHOWN + 10).join(' + ')} -> CO2` });
    expect(fault).toMatchObject({ code: 'several-balances', dimension: MOST_SHOWN + 10 });
    const { family, message } = fault as { family: readonly { plain: string }[]; message: string };
    expect(family).toHaveLength(MOST_SHOWN);
    expect(message).toContain(`Of ${String(MOST_SHOWN + 10)} minimal ones the ${String(MOST_SHOWN)} with the fewest`);
    for (const { plain } of family.slice(0, 5)) {
      const { left, right } = plainEquation(plain);
      const terms = [
        ...left.map(({ species, coefficient }) => ({ species, nu: coefficient.neg() })),
        ...right.map(({ species, coefficient }) => ({ species, nu: coefficient })),
      ];
      expect(residualOf({ terms }).size).toBe(0);
    }
  });

  it('ends at a limit that is told where a family is beyond it', () => {
    const all = alloys(240);
    const skeleton = `${all.slice(0, 120).join(' + ')} -> ${all.slice(120).join(' + ')}`;
    expect(faultOf({ ask: 'redox', skeleton, medium: 'none' })).toMatchObject({
      code: 'too-hard',
      field: 'skeleton',
      limit: `${String(USUAL_BOUNDS.vectors)} vectors`,
    });
  });
});
