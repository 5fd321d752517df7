import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import { composeCell } from '../../src/cell/compose.ts';
import { electrodesOfDiagram } from '../../src/cell/diagram.ts';
import { showRational } from '../../src/exact/rational.ts';
import { chain } from '../../src/report/result.ts';
import type { Species } from '../../src/species/species.ts';
import { plain, residualByHand } from '../support/plain.ts';

const phasesOf = (text: string): readonly (readonly Species[])[] =>
  text.split(' | ').map((phase) => phase.split(' , ').map((species) => plain(species.trim())));

/** A diagram in canonical spelling, by splitting the text: phases at |, species at a comma, the bridge at ||. */
const diagramOf = (text: string) => {
  const [left = '', right] = text.split(' || ');
  return right === undefined
    ? { left: phasesOf(left), right: [], bridge: false }
    : { left: phasesOf(left), right: phasesOf(right), bridge: true };
};

const rows = readFileSync('fixtures/cell/diagrams.tsv', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => {
    const [diagram = '', anode = '', cathode = '', overall = '', electrons = '', notes = ''] = line.split('\t');
    return { diagram, anode, cathode, overall, electrons, notes };
  });

const NOTED = /^(?:spectator|inert-electrode|species-dropped)$/;

describe('the table of diagrams', () => {
  it.each(rows)('was written down right by an independent count: $diagram', ({ anode, cathode, overall }) => {
    for (const text of [anode, cathode]) expect(residualByHand(text).size).toBe(0);
    if (overall !== '') expect(residualByHand(overall).size).toBe(0);
  });

  it.each(rows)('gives the electrodes of $diagram', ({ diagram, anode, cathode, overall, electrons, notes }) => {
    const electrodes = electrodesOfDiagram(diagramOf(diagram));
    if (!electrodes.ok) throw new Error(electrodes.fault.message);
    expect(electrodes.value.anode.map(({ half }) => plainReaction(half.reaction))).toEqual([anode]);
    expect(electrodes.value.cathode.map(({ half }) => plainReaction(half.reaction))).toEqual([cathode]);
    const told = electrodes.notes
      .filter(({ code }) => NOTED.test(code))
      .map(({ code, message }) => `${code} ${message.split(' ')[0] ?? ''}`);
    expect(told.join(';')).toBe(notes);
    const cell = chain(electrodes, composeCell);
    if (!cell.ok) throw new Error(cell.fault.message);
    expect(plainReaction(cell.value.overall)).toBe(overall);
    expect(showRational(cell.value.electrons)).toBe(electrons);
  });
});

describe('a diagram that does not say a reaction', () => {
  const faultOf = (text: string) => {
    const result = electrodesOfDiagram(diagramOf(text));
    return result.ok ? null : result.fault;
  };

  it('is refused where a half-cell holds no couple, and says which', () => {
    const fault = faultOf('Pt | Zn^2+ || Cu^2+ | Cu');
    expect(fault?.code).toBe('no-balance');
    expect(fault?.message).toContain('left half-cell');
  });

  it('is refused where a half-cell exchanges no electrons', () => {
    expect(faultOf('Zn | Zn^2+ || H^+ , SO4^2- , HSO4^- | Pt')).toMatchObject({ code: 'no-electrons' });
  });

  it('is refused where a half-cell allows several reactions, and lists them', () => {
    const fault = faultOf('Zn , Fe | Zn^2+ , Fe^2+ || Cu^2+ | Cu');
    expect(fault).toMatchObject({ code: 'several-balances', dimension: 2 });
  });
});
