import { describe, expect, test } from 'vitest';
import { readDiagram } from '../../src/species/diagram.ts';
import { plainWithState } from '../../src/species/species.ts';

/** `a, b | c || d`, as the IUPAC Green Book (3rd ed., 2.13) writes it. */
const shown = (text: string): string => {
  const result = readDiagram(text);
  if (!result.ok) throw new Error(result.fault.message);
  const { left, right, bridge } = result.value;
  const side = (phases: typeof left): string => phases.map((phase) => phase.map(plainWithState).join(', ')).join(' | ');
  return bridge ? `${side(left)} || ${side(right)}` : side(left);
};

describe('cell diagrams (IUPAC Green Book 2007, 2.13; variants: common practice)', () => {
  test.each([
    ['Zn | Zn^2+ || Cu^2+ | Cu', 'Zn | Zn^2+ || Cu^2+ | Cu'],
    ['Zn|Zn2+||Cu2+|Cu', 'Zn | Zn^2+ || Cu^2+ | Cu'],
    ['Zn(s)|Zn2+(aq, 1 M)||Cu2+(aq, 0.1 mol/L)|Cu(s)', 'Zn(s) | Zn^2+(aq) || Cu^2+(aq) | Cu(s)'],
    ['Zn/Zn2+//Cu2+/Cu', 'Zn | Zn^2+ || Cu^2+ | Cu'],
    ['Zn | Zn^2+ ‖ Cu^2+ | Cu', 'Zn | Zn^2+ || Cu^2+ | Cu'],
    ['Zn | Zn^2+ ¦¦ Cu^2+ | Cu', 'Zn | Zn^2+ || Cu^2+ | Cu'],
    ['Zn | Zn^2+ | | Cu^2+ | Cu', 'Zn | Zn^2+ || Cu^2+ | Cu'],
    ['Zn | ZnSO4(aq) ¦ CuSO4(aq) | Cu', 'Zn | ZnSO4(aq) | CuSO4(aq) | Cu'],
    ['Pt | Fe^2+, Fe^3+ || Ag^+ | Ag', 'Pt | Fe^2+, Fe^3+ || Ag^+ | Ag'],
    ['Pt | H2(g, 1 bar) | HCl(aq) | AgCl | Ag', 'Pt | H2(g) | HCl(aq) | AgCl | Ag'],
    ['Pt | H2 (p = 1 bar) | H^+ (a = 1) || Cl^- (sat.) | Cl2 | Pt', 'Pt | H2 | H^+ || Cl^- | Cl2 | Pt'],
    ['Ag|AgCl|Cl^-(m = 0.5 mol/kg)||Cu^2+(0.1 M)|Cu', 'Ag | AgCl | Cl^- || Cu^2+ | Cu'],
    [
      'Hg | Hg2SO4 | SO4^2- || [Fe(CN)6]3-, [Fe(CN)6]4- | Pt',
      'Hg | Hg2SO4 | SO4^2- || [Fe(CN)6]^3-, [Fe(CN)6]^4- | Pt',
    ],
  ])('reads %s', (text, expected) => {
    expect(shown(text)).toBe(expected);
  });

  test('notes each concentration that it ignores', () => {
    const result = readDiagram('Zn | Zn^2+(0.1 M) || Cu^2+ (aq, 1 mol/L) | Cu');
    if (!result.ok) throw new Error(result.fault.message);
    expect(result.notes.map(({ code }) => code)).toEqual(['concentration-ignored', 'concentration-ignored']);
    expect(result.notes[0]?.message).toContain('0.1 M');
  });

  test('says where no salt bridge stands', () => {
    const result = readDiagram('Pb | PbSO4 | H2SO4(aq) | PbO2 | Pt');
    if (!result.ok) throw new Error(result.fault.message);
    expect(result.value.bridge).toBe(false);
    expect(result.value.left).toHaveLength(5);
    expect(result.value.right).toEqual([]);
  });
});

describe('what is no cell diagram', () => {
  test.each([
    ['', 'empty', 0, 0],
    ['Zn', 'bad-ask', 0, 2],
    ['Zn || ', 'empty-side', 3, 5],
    ['| Zn^2+ || Cu', 'empty-side', 0, 1],
    ['Zn | Zn^2+, || Cu', 'empty-side', 10, 11],
    ['Zn | Xx || Cu', 'unknown-element', 5, 7],
    ['Zn | Zn^2 || Cu', 'bad-charge', 7, 9],
    ['Zn | (Cl || Cu', 'bracket', 5, 6],
    ['Zn|Zn^2+||Cu^2+|Cu||Ag', 'bad-ask', 18, 20],
    ['Ag | I3- || Cu^2+ | Cu', 'several-readings', 5, 8],
  ])('refuses "%s" as %s at %i to %i', (text, code, from, to) => {
    const result = readDiagram(text);
    if (result.ok) throw new Error('it was read');
    expect({ code: result.fault.code, span: result.fault.span }).toEqual({ code, span: { from, to } });
  });
});
