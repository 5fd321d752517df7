import { bench, describe } from 'vitest';
import { QUANTITIES } from '../../src/amounts/quantities.ts';
import { readQuantity } from '../../src/amounts/quantity.ts';
import { readRecord } from '../../src/amounts/record/record.ts';
import { amountsOf, electrodeCircuit } from '../amounts/circuit.ts';

describe('amounts', () => {
  bench('read a quantity with its uncertainty', () => {
    readQuantity('2.000 A ± 0.004 A', QUANTITIES.current);
  });

  bench('read a unit expression', () => {
    readQuantity('1.185 g/(A h)', QUANTITIES.mass_per_charge);
  });

  bench('copper from current and time, with uncertainty', () => {
    amountsOf('Cu^2+ + 2 e^- -> Cu', 'Cu', { current: '250(2) A', time: '1 h 30 min', efficiency: '96(1) %' });
  });

  const zinc = electrodeCircuit(['Zn^2+ + 2 e^- -> Zn'], ['2 H2O + 2 e^- -> H2(g) + 2 OH^-']);
  bench('a share found from a weighed deposit, hydrogen alongside', () => {
    amountsOf(zinc, 'Zn', { charge: '100 A h', mass: '103.7(1) g', temperature: '25 °C', pressure: '1 bar' });
  });

  const record = Array.from({ length: 1000 }, (_, at): [string, string] => [`${String(at)} s`, `${String(at % 7)} A`]);
  bench('a record of a thousand readings', () => {
    readRecord(record);
  });
});
