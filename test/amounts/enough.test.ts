import { describe, expect, it } from 'vitest';
import type { AmountsRequest } from '../../src/amounts/working.ts';
import { answerOf, faultOf } from './outcome.ts';

const COPPER = 'Cu^2+ + 2 e^- -> Cu';
const PLUTONIUM = 'Pu^3+ + 3 e^- -> Pu';

type Given = AmountsRequest['given'];

describe('what leads nowhere', () => {
  it.each<Given>([
    { area: '1 dm^2' },
    { from: '1 g/L' },
    { volume: '1 L' },
    { thickness: '1 µm' },
    { temperature: '25 °C' },
    { temperature: '25 °C', pressure: '1 bar' },
    { from: '1 g/L', to: '1 g/L' },
  ])('%j beside a charge is noted, and the mass is answered', (unused) => {
    const { quantities, notes } = answerOf(COPPER, 'Cu', { charge: '1 A h', ...unused });
    expect(quantities['mass']?.value).toBeCloseTo(1.185494, 6);
    expect(notes).toContain('given-unused');
  });

  it('does not call a density unused that turned a mass fraction into a concentration', () => {
    const tank = { volume: '1 L', from: '500 ppm', to: '100 ppm', density: '1 kg/L' };
    const { quantities, notes } = answerOf(COPPER, 'Cu^2+', tank);
    expect(quantities['mass']?.value).toBeCloseTo(0.4, 9);
    expect(notes).not.toContain('given-unused');
  });

  it('says that there is no weight rather than asking for more', () => {
    const fault = { code: 'not-enough-given', missing: ['molar_mass'] };
    const wanted = faultOf(PLUTONIUM, 'Pu', { charge: '1 C' }, { want: { mass: 'g' } });
    expect(wanted).toMatchObject({ ...fault, field: 'want.mass' });
    expect(wanted.message).toContain('Pu has no standard atomic weight');
    expect(faultOf(PLUTONIUM, 'Pu', { mass: '1 g' })).toMatchObject({ ...fault, field: 'given' });
  });

  it('names a blank or a vapour pressure itself, which never follows', () => {
    const wanted = faultOf(COPPER, 'Cu', { charge: '1 C' }, { want: { blank: 'C' } });
    expect(wanted).toMatchObject({ code: 'not-enough-given', field: 'want.blank', missing: ['blank'] });
  });

  it.each<readonly [string, string, readonly string[]]>([
    ['temperature', 'K', ['temperature']],
    ['from', 'g/L', ['volume', 'to']],
    ['area', 'dm^2', ['time', 'current_density']],
  ])('names what would give %s', (name, unit, missing) => {
    expect(faultOf(COPPER, 'Cu', { charge: '1 A h' }, { want: { [name]: unit } })).toMatchObject({ missing });
  });

  it('names nothing where only a division by nothing is in the way', () => {
    const still = { from: '3 g/L', to: '3 g/L', charge: '1 C' };
    const fault = faultOf(COPPER, 'Cu^2+', still, { want: { volume: 'L' } });
    expect(fault).toMatchObject({ code: 'not-enough-given', field: 'want.volume', missing: [] });
    expect(fault.message).toContain('divided by 0');
  });
});
