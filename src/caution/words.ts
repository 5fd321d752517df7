import type { CautionMedium, CautionMode } from './scene.ts';

/** How a caution says in which medium it applies. */
const MEDIA: Readonly<Record<CautionMedium, string>> = {
  acid: 'in acid',
  base: 'in base',
  neutral: 'in neutral solution',
  molten: 'in a melt',
  nonaqueous: 'in a nonaqueous electrolyte',
};

const MODES: Readonly<Record<CautionMode, string>> = {
  electrolysis: 'in electrolysis',
  galvanic: 'when the cell delivers current',
  charging: 'on charging',
};

/** What only the person at the cell can say. */
const CONDITIONS: Readonly<Record<string, string>> = {
  'undivided-cell': 'in an undivided cell',
  'closed-vessel': 'in a closed vessel',
  'closed-room': 'in a closed room',
  hot: 'when hot',
  concentrated: 'when concentrated',
  alkaline: 'when alkaline',
  aged: 'when aged',
  'strong-acid': 'in strong acid',
  'strong-light': 'in strong light',
  'strong-oxidant': 'with a strong oxidant',
  catalyst: 'with a catalyst',
  overcharge: 'on overcharge',
  'damp-solid': 'as a damp solid',
  'high-overpotential': 'at a high overpotential',
  'pbo2-anode': 'at a PbO2 anode',
  'diamond-anode': 'at a diamond anode',
  'metal-dissolution': 'during metal dissolution',
  'peroxide-crust': 'under a peroxide crust',
  'organic-electrolyte': 'with an organic electrolyte',
  powder: 'as powder',
  'sponge-deposit': 'as a sponge deposit',
  'alkaline-battery-charging': 'on charging an alkaline battery',
  'series-string-above-60-vdc': 'in a series string above 60 V of direct current',
  'external-short': 'on an external short',
  'drain-disposal': 'on disposal to a drain',
};

export const isMedium = (word: string): word is CautionMedium => Object.hasOwn(MEDIA, word);
export const isMode = (word: string): word is CautionMode => Object.hasOwn(MODES, word);
export const isCondition = (word: string): boolean => Object.hasOwn(CONDITIONS, word);

const orList = (phrases: readonly string[]): string =>
  phrases.length < 2 ? phrases.join('') : `${phrases.slice(0, -1).join(', ')} or ${phrases.at(-1) ?? ''}`;

export const mediaPhrase = (media: readonly CautionMedium[]): string => orList(media.map((word) => MEDIA[word]));
export const modesPhrase = (modes: readonly CautionMode[]): string => orList(modes.map((word) => MODES[word]));
export const conditionsPhrase = (conditions: readonly string[]): string =>
  orList(conditions.map((word) => CONDITIONS[word] ?? word));

/** The sentence that names what the scene leaves open, each group a choice: "Applies in acid, and when hot." */
export const appliesSentence = (groups: readonly string[]): string => `Applies ${groups.join(', and ')}.`;
