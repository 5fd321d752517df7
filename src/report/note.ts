/** What the reader of an answer must know: a medium assumed, a reading chosen, a remark dropped. */
export interface Note {
  /** Kebab-case, stable: programs compare it. Every code is listed in `NOTE_CODES`. */
  readonly code: NoteCode;
  /** One sentence a chemist reads. */
  readonly message: string;
}

/** The codes that notes carry, each with when it is given. */
export const NOTE_CODES = {
  'medium-assumed': 'no medium was given and the text shows none: acid was taken',
  'medium-from-text': 'the medium was taken from the H^+ or OH^- in the text',
  'medium-preference': 'helpers of a built-in medium depend on one another; its printed preference settled it',
  'reading-chosen': 'a spelling with several readings was read as the commonest',
  'look-alike': 'a character was read as the one it stands for',
  'remark-dropped': 'a remark inside a state was dropped',
  'concentration-ignored': 'a concentration in a cell diagram was ignored',
  'coefficients-ignored': 'coefficients in a skeleton were ignored',
  'species-dropped': 'a species on both sides came out at 0 and was left out',
  'other-balances': 'other balances exist; the only elementary one was taken',
  'hydronium-folded': 'H3O^+ was read as H^+ and H2O, as asked',
  scaled: 'the answer stands at the scale asked for, not in lowest whole numbers',
  settled: 'a solution that was not unique was settled by the assumption given',
  'no-molar-mass': 'an element or nuclide here has no standard atomic weight',
  'no-oxidation-numbers': 'convention does not decide the oxidation numbers',
  'halves-omitted': 'no two halves add up to the overall reaction',
  'multiplier-omitted': 'no multipliers take the halves to the overall reaction',
  'media-differ': 'the electrodes stand in different media and were folded all the same',
  'states-differ': 'one species stands in two states and was not cancelled',
  'nothing-left': 'everything cancelled: nothing is left of the overall reaction',
  spectator: 'an ion of the electrolyte takes no part',
  'inert-electrode': 'a terminal of the diagram was taken as inert',
  fractions: 'fractional coefficients conserve; they are accepted as written',
  'common-factor': 'all coefficients share a common factor',
  'not-unique': "the written species allow more than one balance: the ratio is the writer's choice",
  'medium-clash': 'an ion foreign to the medium is written',
  'electrons-left': 'electrons are left in an overall reaction',
  'both-sides': 'a species stands on both sides and could be cancelled',
  'not-redox': 'nothing is oxidised or reduced',
  'state-missing': 'some species carry a state and some do not',
  rounding: 'a decimal coefficient misses by rounding only',
  'no-repair': 'no plausible repair was found',
  'electrode-turned': 'in an audit: a reduction is written at the anode, or an oxidation at the cathode',
  'not-the-sum': 'in an audit: the overall equation is no sum of multiples of the electrode equations',
  'electrons-claimed': 'in an audit: another electron number was claimed than the one found',
  tie: 'several repairs are equally plausible',
  'used-as-written': 'the half-reaction conserves and was used as written',
  'share-assigned': 'a reaction without a share took the rest of the current',
  'share-found': 'a share was found from what was measured',
  'surplus-agrees': 'more was given than was needed, and it agrees',
  'efficiency-over-100': 'a current efficiency over 100 %: look at the balance, the record and the reactions',
  'efficiency-assumed': 'no efficiency was given and none follows: 100 % was taken',
  'given-unused': 'a quantity given leads nowhere without others',
  'gas-assumed': 'a species without a state was taken as a gas',
  'dry-gas': 'no vapour pressure was given: the gas was taken as dry',
  'per-area': 'no area was given: thickness is per unit area',
  'unit-reading': 'a unit with more than one meaning was read as the one stated',
  'runs-backwards': 'the net charge is negative: amounts are negative, the reaction runs the other way',
  'below-zero': 'a concentration comes out below nothing, within the digits of what was given',
  summed: 'a species takes part in several reactions; its amounts were added',
} as const;

/** One of the stable note codes. */
export type NoteCode = keyof typeof NOTE_CODES;

/** A note with this code and sentence. */
export const note = (code: NoteCode, message: string): Note => ({ code, message });
