import { showRational } from '../../exact/rational.ts';
import type { Medium } from '../../redox/medium.ts';
import { note } from '../../report/note.ts';
import { type Result, success } from '../../report/result.ts';
import type { Equation, EquationTerm } from '../../species/equation.ts';
import { molarMass } from '../../species/molar-mass.ts';
import { oxidationNumbers } from '../../species/oxidation.ts';
import type { SpeciesReading } from '../../species/read.ts';
import { type Species, plainSpecies, plainWithState } from '../../species/species.ts';
import type { EquationAnswer, SpeciesAnswer } from '../schema/answer.ts';
import type { Quantity, ShownMedium, ShownSpecies } from '../schema/shape.ts';

/** The contract's SPECIES. */
export const showSpecies = (species: Species): ShownSpecies => ({
  plain: plainWithState(species),
  composition: Object.fromEntries([...species.composition].map(([key, count]) => [key, showRational(count)])),
  charge: showRational(species.charge),
  state: species.state,
});

/** A medium by its name, or the helpers that were given. */
export const showMedium = (medium: Medium): ShownMedium => medium.name ?? { helpers: medium.helpers.map(plainSpecies) };

const massOf = (species: Species): Result<Quantity | null> => {
  const mass = molarMass(species);
  if (mass.kind === 'missing') {
    const message = `${mass.element} has no standard atomic weight: no molar mass is given.`;
    return success(null, [note('no-molar-mass', message)]);
  }
  return success({ value: mass.value, unit: 'g/mol', uncertainty: mass.uncertainty });
};

const numbersOf = (species: Species): Result<Readonly<Record<string, readonly string[]>> | null> => {
  const found = oxidationNumbers(species);
  if (found.kind === 'undecided') return success(null, [note('no-oxidation-numbers', found.why)]);
  return success(Object.fromEntries([...found.numbers].map(([element, list]) => [element, list.map(showRational)])));
};

/** The answer to an ask of kind `species`. Notes: `no-molar-mass`, `no-oxidation-numbers`. */
export const showReading = ({ species, readings }: SpeciesReading): Result<SpeciesAnswer> => {
  const mass = massOf(species);
  const numbers = numbersOf(species);
  if (!mass.ok) return mass;
  if (!numbers.ok) return numbers;
  return success(
    {
      species: showSpecies(species),
      readings: readings.map(showSpecies),
      ...(mass.value === null ? {} : { molarMass: mass.value }),
      ...(numbers.value === null ? {} : { oxidationNumbers: numbers.value }),
    },
    [...mass.notes, ...numbers.notes],
  );
};

const showTerm = ({ coefficient, species }: EquationTerm): EquationAnswer['left'][number] => ({
  coefficient: showRational(coefficient),
  species: showSpecies(species),
});

/** The answer to an ask of kind `equation`: the terms as written. */
export const showEquation = ({ left, right }: Equation): EquationAnswer => ({
  left: left.map(showTerm),
  right: right.map(showTerm),
});
