import type { Fault } from '../report/fault.ts';

/** What the contract calls a field of JSON, and how the same is said on a command line. */
const HINTS: readonly (readonly [said: RegExp, here: string])[] = [
  [/give it in where, as \{"(\w+)": "0\.4"\}/, 'give it a value: --where $1=0.4'],
  [/^Leave settle out\.$/, 'Leave --settle out.'],
  [/^Ask without irreducible\.$/, 'Leave --irreducible out.'],
  [/, or a list of helpers\.$/, '; or give --helpers.'],
  [/, or ask for a half-reaction\.$/, ', or balance it with couplet half.'],
  [/^Give the medium: acid, base or neutral\.$/, 'Give one: --medium acid, base or neutral.'],
  [/^Write \[\["0 s", .*$/, 'couplet record FILE finds the charge of a record: --given charge=...'],
];

/** Where a share may stand behind a reaction: at an electrode. */
const SHARED = /^(?:cell\.)?(?:anode|cathode|electrode|half)\b/;

const hintFor = ({ code, field = '', message, hint = '' }: Fault): string => {
  if (code === 'unknown-character' && message.startsWith('@')) {
    return SHARED.test(field)
      ? 'A share stands behind the whole reaction: "Cu^2+ -> Cu @ 95 %".'
      : 'Shares (@ 95 %) are for couplet cell and couplet amounts.';
  }
  return HINTS.reduce((text, [said, here]) => text.replace(said, here), hint);
};

/** The same fault, its hint in the words of the command line. */
export const forCommandLine = (fault: Fault): Fault => {
  const hint = hintFor(fault);
  return hint === '' ? fault : { ...fault, hint };
};

/** "medium" is `--medium`, "medium.helpers[0]" `--helpers`, "where.x" `--where x`. */
const optionOf = (field: string): string => {
  const [name = '', part] = field.split('.');
  if (part?.startsWith('helpers') === true) return '--helpers';
  return part === undefined ? `--${name}` : `--${name} ${part}`;
};

/** The same fault, its field named by the option that holds it. */
export const asOption = (fault: Fault): Fault => ({ ...forCommandLine(fault), field: optionOf(fault.field ?? '') });
