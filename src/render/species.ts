import type { EquationAnswer, SpeciesAnswer } from '../desk/schema/answer.ts';
import type { ShownSpecies } from '../desk/schema/shape.ts';
import { labelled } from './block.ts';
import { columns } from './columns.ts';
import { quantityText } from './figure.ts';
import type { Look } from './look.ts';
import { numberText, speciesText } from './spelling.ts';

const spelled = (species: ShownSpecies, look: Look): string => speciesText(species.plain, look);

const atoms = (species: ShownSpecies): string =>
  Object.entries(species.composition)
    .map(([element, count]) => `${element} ${count}`)
    .join('   ');

const signed = (charge: string, look: Look): string =>
  /^[1-9]/.test(charge) ? `+${charge}` : numberText(charge, look);

/** What a spelling was read as. */
export const speciesBlocks = (answer: SpeciesAnswer, look: Look): readonly (readonly string[])[] => {
  const { species, readings, molarMass, oxidationNumbers } = answer;
  const others = readings.slice(1).map((reading) => spelled(reading, look));
  const numbers = Object.entries(oxidationNumbers ?? {}).map(
    ([element, list]) => `${element} ${list.map((number) => numberText(number, look)).join(', ')}`,
  );
  const rows: readonly (readonly [string, string])[] = [
    ['atoms', atoms(species)],
    ['charge', signed(species.charge, look)],
    ...(molarMass === undefined ? [] : [['molar mass', quantityText(molarMass)] as const]),
    ...(numbers.length === 0 ? [] : [['oxidation', numbers.join('   ')] as const]),
    ...(others.length === 0 ? [] : [['or read as', others.join('   ')] as const]),
  ];
  return [[look.paint.strong(spelled(species, look))], labelled(rows, look)];
};

/** The terms of an equation as they were read. */
export const equationBlocks = (answer: EquationAnswer, look: Look): readonly (readonly string[])[] => {
  const side = (label: string, terms: EquationAnswer['left']): readonly (readonly string[])[] =>
    terms.map(({ coefficient, species }, at) => [
      at === 0 ? label : '',
      coefficient,
      spelled(species, look),
      atoms(species),
      species.charge === '0' ? '' : `charge ${signed(species.charge, look)}`,
    ]);
  const rows = [...side('left', answer.left), ...side('right', answer.right)];
  return [columns(rows, ['left', 'right', 'left', 'left', 'left'])];
};
