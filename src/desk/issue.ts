import type * as z from 'zod';
import type { Fault } from '../report/fault.ts';
import { didYouMean, nearest } from '../report/suggest.ts';

/** What a schema finds wrong in one place. */
export type Issue = z.core.$ZodIssue;

/** A path as the contract names fields: ["anode", 1, "share"] is `anode[1].share`. */
export const fieldName = (path: readonly PropertyKey[]): string =>
  path.reduce<string>((name, step) => {
    if (typeof step === 'number') return `${name}[${String(step)}]`;
    return name === '' ? String(step) : `${name}.${String(step)}`;
  }, '');

const weight = (issues: readonly Issue[]): number =>
  issues.reduce((sum, issue) => sum + (issue.code === 'unrecognized_keys' ? issue.keys.length : 1), 0);

/** Wrong at its very root: the value is not even of the branch's type. */
const foreign = (issues: readonly Issue[]): boolean =>
  issues.some((issue) => issue.code === 'invalid_type' && issue.path.length === 0);

/** The branch of a union that was meant: of the right type, with the fewest things wrong; none: the union itself. */
const meantBranch = (issue: Issue): readonly Issue[] => {
  if (issue.code !== 'invalid_union') return [issue];
  const [branch] = issue.errors.filter((issues) => !foreign(issues)).sort((one, other) => weight(one) - weight(other));
  if (branch === undefined) return [issue];
  return branch.flatMap((inner) => meantBranch({ ...inner, path: [...issue.path, ...inner.path] }));
};

/** The issue to report: an unknown key before all else, since a missing field is often its misspelling. */
export const foremost = (issues: readonly Issue[]): Issue => {
  const flat = issues.flatMap(meantBranch);
  const found = flat.find((issue) => issue.code === 'unrecognized_keys') ?? flat[0];
  if (found === undefined) throw new RangeError('a schema refused a value without an issue');
  return found;
};

const NESTED_FIELDS = [
  'skeleton',
  'medium',
  'share',
  'settle',
  'helpers',
  'half',
  'anode',
  'cathode',
  'separator',
  'diagram',
  'electrode',
  'species',
  'given',
  'want',
  'between',
  'coefficient',
];

const TYPES: Readonly<Record<string, string>> = {
  string: 'text',
  array: 'a list',
  tuple: 'a pair',
  object: 'an object',
  record: 'an object',
  boolean: 'true or false',
  number: 'a number',
};

/** A reaction is called `skeleton` in a cell and `half` at the electrode of an ask of amounts. */
const TWINS: Readonly<Record<string, string>> = { skeleton: 'half', half: 'skeleton' };

const unknownKey = (path: readonly PropertyKey[], key: string, known: readonly string[], where: string): Fault => {
  const candidates = (path.length === 0 ? known : [...NESTED_FIELDS, ...known]).filter((name) => name !== key);
  const twin = path.length === 0 ? undefined : TWINS[key];
  const guess = didYouMean(twin === undefined ? nearest(key, candidates, 3, 1) : [twin]);
  const fields = path.length === 0 ? `The fields are ${known.join(', ')}.` : undefined;
  const hint = guess ?? fields;
  const field = fieldName([...path, key]);
  const message = `There is no field ${key} in ${path.length === 0 ? where : fieldName(path)}.`;
  return { code: 'bad-ask', field, message, ...(hint === undefined ? {} : { hint }) };
};

const CELL_FORMS = 'Give the cell as anode and cathode, or as a diagram.';

const wrongType = (field: string, issue: Issue & { readonly code: 'invalid_type' }): Fault => {
  const wanted = TYPES[issue.expected] ?? issue.expected;
  if (issue.message.endsWith('received undefined')) {
    const hint = /(^|\.)cell\.diagram$/u.test(field) ? CELL_FORMS : `Give ${field} as ${wanted}.`;
    return { code: 'bad-ask', field, message: `${field} is missing.`, hint };
  }
  const hint = wanted === 'text' ? 'Numbers and quantities are written as text: "0.4", "2 A".' : undefined;
  const message = `${field} must be ${wanted}.`;
  return { code: 'bad-ask', field, message, ...(hint === undefined ? {} : { hint }) };
};

/** Something else stands where a part with fields is wanted: nothing, a text, a list. */
const noFields = (known: readonly string[], where: string): Fault => {
  const message = `${where.slice(0, 1).toUpperCase()}${where.slice(1)} must be written as fields, each with its value.`;
  return { code: 'bad-ask', field: '', message, hint: `The fields are ${known.join(', ')}.` };
};

/** The `bad-ask` that says what a schema found: `known` are the field names of the object, `where` its name. */
export const issueFault = (issue: Issue, known: readonly string[], where: string): Fault => {
  if (issue.code === 'unrecognized_keys') return unknownKey(issue.path, issue.keys[0] ?? '', known, where);
  const field = fieldName(issue.path);
  if (field === '') return noFields(known, where);
  if (issue.code === 'invalid_type') return wrongType(field, issue);
  if (issue.code === 'too_small') return { code: 'bad-ask', field, message: `${field} is empty.` };
  return { code: 'bad-ask', field, message: `${field} has a form that is not understood.` };
};
