import { type Note, note } from '../report/note.ts';
import { type Result, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { didYouMean, nearest } from '../report/suggest.ts';
import type { Equation, EquationTerm } from '../species/equation.ts';
import { type Species, isElectron, plainSpecies, sameSpecies } from '../species/species.ts';
import { HYDROXIDE, MEDIA, PROTON, mediumRow } from './media.ts';
import type { Medium, MediumName } from './medium.ts';

/** What an ask says of the medium: a name, a list of helper species, or nothing. */
export type MediumChoice = string | { readonly helpers: readonly Species[] } | undefined;

/**
 * The medium of a skeleton. Left out, it is taken from the H^+ or OH^- in the text (note `medium-from-text`), else it
 * is acid (note `medium-assumed`).
 * Faults: `unknown-medium`; `bad-ask` where nothing is said and both H^+ and OH^- are written, and for e^- as a helper.
 */
export const chooseMedium = (choice: MediumChoice, skeleton: Equation): Result<Medium> => {
  if (choice === undefined) return fromText(skeleton);
  return typeof choice === 'string' ? namedMedium(choice) : listedMedium(choice.helpers);
};

/** The built-in medium called `name`; fault `unknown-medium` with the nearest names. */
export const namedMedium = (name: string): Result<Medium> => {
  const row = mediumRow(name);
  if (row !== undefined) return success({ name: row.name, helpers: row.helpers });
  const names = MEDIA.map((one) => one.name);
  const words = MEDIA.flatMap((one) => [one.name, ...one.alias]);
  const meant = nearest(name, words, 3, 3).map((word) => MEDIA.find((one) => one.alias.includes(word))?.name ?? word);
  const known = `The media are ${names.join(', ')}, or a list of helpers.`;
  const guess = didYouMean([...new Set(meant)]);
  return failure({
    code: 'unknown-medium',
    field: 'medium',
    span: wholeSpan(name),
    message: name === '' ? 'The medium has no name.' : `There is no built-in medium called ${name}.`,
    hint: guess === undefined ? known : `${guess} ${known}`,
  });
};

const listedMedium = (helpers: readonly Species[]): Result<Medium> => {
  if (helpers.some(isElectron)) {
    return failure({
      code: 'bad-ask',
      field: 'medium',
      message: 'e^- cannot be a helper: the electrons of a half-reaction are found without it.',
      hint: 'Leave e^- out of the helpers.',
    });
  }
  const first = (species: Species, index: number): boolean =>
    helpers.findIndex((other) => sameSpecies(other, species)) === index;
  return success({ name: null, helpers: helpers.filter(first) });
};

const fromText = (skeleton: Equation): Result<Medium> => {
  const terms = [...skeleton.left, ...skeleton.right];
  const find = (ion: Species): EquationTerm | undefined => terms.find((term) => sameSpecies(term.species, ion));
  const [proton, hydroxide] = [find(PROTON), find(HYDROXIDE)];
  if (proton !== undefined && hydroxide !== undefined) {
    const later = proton.span.from > hydroxide.span.from ? proton : hydroxide;
    return failure({
      code: 'bad-ask',
      span: later.span,
      message: 'Both H^+ and OH^- are written and no medium is given.',
      hint: 'Give the medium: acid, base or neutral.',
    });
  }
  if (proton !== undefined) return assumed('acid', saysText('acid', PROTON));
  if (hydroxide !== undefined) return assumed('base', saysText('base', HYDROXIDE));
  const message = 'No medium was given and the text shows none: acid was taken.';
  return assumed('acid', note('medium-assumed', message));
};

const saysText = (name: MediumName, ion: Species): Note =>
  note('medium-from-text', `No medium was given: ${name} was taken from the ${plainSpecies(ion)} in the text.`);

const assumed = (name: MediumName, said: Note): Result<Medium> =>
  success({ name, helpers: mediumRow(name)?.helpers ?? [] }, [said]);
