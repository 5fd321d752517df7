import { bench, describe } from 'vitest';
import { composeCell } from '../../src/cell/compose.ts';
import { electrodesOfDiagram } from '../../src/cell/diagram.ts';
import { balanceRedox } from '../../src/redox/redox.ts';
import { electrodesOf } from '../cell/cell-of.ts';
import { plain, plainEquation } from '../support/plain.ts';

const daniell = electrodesOf(['Zn -> Zn^2+ + 2 e^-'], ['Cu^2+ + 2 e^- -> Cu']);
const ethanol = electrodesOf(
  ['C2H5OH + H2O -> CH3COOH + 4 H^+ + 4 e^-'],
  ['Cr2O7^2- + 14 H^+ + 6 e^- -> 2 Cr^3+ + 7 H2O'],
);
const shared = electrodesOf(
  ['2 H2O -> O2 + 4 H^+ + 4 e^-'],
  ['0.5 @ CO2 + 2 H^+ + 2 e^- -> CO + H2O', '0.3 @ CO2 + 2 H^+ + 2 e^- -> HCOOH', '0.2 @ 2 H^+ + 2 e^- -> H2'],
);
const accumulator = {
  left: [['Pb'], ['PbSO4'], ['H^+', 'SO4^2-'], ['PbSO4'], ['PbO2'], ['Pt']].map((phase) => phase.map(plain)),
  right: [],
  bridge: false,
};
const ionic = plainEquation('MnO4^- + C2O4^2- -> Mn^2+ + CO2');
const molecular = plainEquation('K2Cr2O7 + FeSO4 + H2SO4 -> Cr2(SO4)3 + Fe2(SO4)3 + K2SO4 + H2O');

describe('composing', () => {
  bench('two metals', () => {
    composeCell(daniell);
  });
  bench('an organic with dichromate', () => {
    composeCell(ethanol);
  });
  bench('three reactions by shares', () => {
    composeCell(shared);
  });
  bench('a diagram to its electrodes', () => {
    electrodesOfDiagram(accumulator);
  });
});

describe('splitting', () => {
  bench('ions', () => {
    balanceRedox(ionic, 'acid');
  });
  bench('a molecular skeleton', () => {
    balanceRedox(molecular, undefined);
  });
});
