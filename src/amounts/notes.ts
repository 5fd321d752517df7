import { type Note, note } from '../report/note.ts';
import type { AmountsAnswer, Working } from './working.ts';
import type { Parts } from './alongside.ts';
import { showPercent } from './found-shares.ts';
import { idleGivens } from './enough.ts';
import { gasKind } from './gases.ts';
import type { VariableName } from './relations.ts';
import { PER_AREA } from './unit-area.ts';

const ROUNDING = 1e-9;

const when = (holds: boolean, code: Note['code'], message: string): readonly Note[] =>
  holds ? [note(code, message)] : [];

const partsShown = ({ parts }: Parts): string =>
  parts.map((part) => (part === null ? 'unknown' : showPercent(part))).join(', ');

const shareNotes = ({ problem, derived, parts }: Working): readonly Note[] => {
  const efficiency = derived.known.get('efficiency');
  const found = derived.steps.some(({ name }) => name === 'efficiency');
  const assumed = derived.assumed.has('efficiency');
  const electrode = problem.circuit.kind === 'electrode';
  return [
    ...when(
      electrode && found && !parts.found,
      'share-found',
      `the share of the reaction of ${problem.asked.name} was found from what was measured`,
    ),
    ...when(
      parts.found,
      'share-found',
      `what was measured of ${problem.asked.name} gives the shares of its reactions: ${partsShown(parts)}`,
    ),
    ...when(parts.rest !== null, 'share-assigned', 'the other reaction takes the rest of the current'),
    ...when(assumed && derived.known.has('amount'), 'efficiency-assumed', 'no efficiency is known: 100 % was taken'),
    ...when(
      efficiency !== undefined && efficiency.value > 1 + ROUNDING,
      'efficiency-over-100',
      'the current efficiency comes out over 100 %: look at the balance, the record and the reactions',
    ),
  ];
};

const volumesShown = (
  { problem, companions, derived }: Working,
  answer: AmountsAnswer,
): readonly { name: string; assumed: boolean }[] =>
  [problem.asked, ...companions.map(({ stake }) => stake)]
    .filter((stake) => {
      // The volume of an ask with from and to is that of the tank.
      if (stake === problem.asked && derived.known.has('drop')) return false;
      const { name } = stake;
      const quantities = name === problem.asked.name ? answer.quantities : answer.alongside[name];
      return quantities?.['volume'] !== undefined;
    })
    .map(({ name, species }) => ({ name, assumed: gasKind(species) === 'assumed' }));

const gasNotes = (working: Working, answer: AmountsAnswer): readonly Note[] => {
  const { derived, given, problem } = working;
  const volumes = volumesShown(working, answer);
  const counted = given.some(({ name }) => name === 'normal') && gasKind(problem.asked.species) === 'assumed';
  const names = volumes.filter((one) => one.assumed).map(({ name }) => name);
  const assumed = [...new Set([...(counted ? [problem.asked.name] : []), ...names])];
  const dry = derived.known.has('dry') && derived.assumed.has('vapour_pressure') && volumes.length > 0;
  return [
    ...when(assumed.length > 0, 'gas-assumed', `without a state, ${assumed.join(', ')} was taken as a gas`),
    ...when(dry, 'dry-gas', 'no vapour pressure was given: the gas was taken as dry'),
  ];
};

const areaNotes = ({ derived }: Working): readonly Note[] => {
  const unit = derived.steps.some(({ relation }) => relation.formula === PER_AREA);
  const free = derived.steps.some(({ name }) => name === 'thickness') && !derived.known.has('area');
  return [
    ...when(unit, 'per-area', 'no area was given: the thickness is that of the mass on 1 m^2'),
    ...when(free && !unit, 'per-area', 'no area was given: the thickness follows from the current density'),
  ];
};

const summedNote = ({ problem }: Working): readonly Note[] => {
  const several = problem.stakes.filter(({ parts }) => parts.length > 1).map(({ name }) => name);
  return when(several.length > 0, 'summed', `in several reactions, and added up: ${several.join(', ')}`);
};

const weightNotes = ({ problem }: Working): readonly Note[] => {
  const weightless = problem.stakes.filter(({ species }) => problem.weigh(species) === undefined);
  const names = weightless.map(({ name }) => name).join(', ');
  return when(weightless.length > 0, 'no-molar-mass', `no standard atomic weight, hence no mass: ${names}`);
};

/** What only other species make use of, or the thickness on one square metre. */
const usedElsewhere = (working: Working, answer: AmountsAnswer): readonly VariableName[] => [
  ...(working.derived.steps.some(({ relation }) => relation.formula === PER_AREA) ? (['density'] as const) : []),
  ...(volumesShown(working, answer).length > 0 ? (['temperature', 'pressure', 'vapour_pressure'] as const) : []),
];

const idleNotes = (working: Working, answer: AmountsAnswer): readonly Note[] => {
  const elsewhere = usedElsewhere(working, answer);
  const idle = idleGivens(working).filter(({ name }) => !elsewhere.includes(name));
  const names = idle.map(({ field }) => field).join(', ');
  return when(idle.length > 0, 'given-unused', `nothing follows from it here, so that it was not used: ${names}`);
};

/** The charge flows against the reaction as written, or what is left of a tank is below nothing by its digits only. */
const signNotes = ({ derived: { known } }: Working): readonly Note[] => {
  const negative = (name: VariableName): boolean => (known.get(name)?.value ?? 0) < 0;
  return [
    ...when(
      negative('net') || negative('amount'),
      'runs-backwards',
      'the charge left after the blank is negative: the reaction runs backwards, and amounts are negative',
    ),
    ...when(
      negative('from') || negative('to'),
      'below-zero',
      'a concentration comes out below nothing, by no more than its digits: take it for 0',
    ),
  ];
};

/** What the reader of an answer must know. */
export const amountNotes = (working: Working, answer: AmountsAnswer): readonly Note[] => [
  ...shareNotes(working),
  ...signNotes(working),
  ...summedNote(working),
  ...gasNotes(working, answer),
  ...areaNotes(working),
  ...weightNotes(working),
  ...idleNotes(working, answer),
];
