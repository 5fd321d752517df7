import { InvalidArgumentError, Option } from '@commander-js/extra-typings';
import type { PrintStyle } from '../notation/print/print.ts';
import type { Showing } from './outcome.ts';

/** NAME=TEXT pairs as they were typed, one after the other. */
export type Pairs = Readonly<Record<string, string>>;

/** Collects a repeatable NAME=TEXT option; the name ends at the first "=". */
export const collectPairs = (typed: string, before: Pairs = {}): Pairs => {
  const at = typed.indexOf('=');
  if (at < 1) throw new InvalidArgumentError('Write NAME=VALUE.');
  const name = typed.slice(0, at).trim();
  if (Object.hasOwn(before, name)) throw new InvalidArgumentError(`${name} is given twice.`);
  return { ...before, [name]: typed.slice(at + 1).trim() };
};

/** Collects a repeatable option. */
export const collect = (typed: string, before: readonly string[] = []): readonly string[] => [...before, typed];

/** "CN^-, H2O, OH^-" as a list. */
const helperList = (typed: string): readonly string[] =>
  typed
    .split(',')
    .map((helper) => helper.trim())
    .filter((helper) => helper !== '');

/** Options that every ask has. */
export const whereOption = new Option(
  '--where <x=0.4>',
  'value of an unknown subscript: --where x=0.4; repeatable',
).argParser<Pairs>(collectPairs);
export const defineOption = new Option(
  '--define <NAME=FORMULA>',
  'a named species: --define "EDTA^4-=C10H12N2O8^4-"; repeatable',
).argParser<Pairs>(collectPairs);
export const strictOption = new Option(
  '--strict',
  'refuse whatever can be read in two ways, such as Fe3+ or the unit g/A h',
);
export const jsonOption = new Option('--json', 'print the answer or the fault as one line of JSON');
export const plainOption = new Option('--plain', 'plain spelling on a terminal too: Cu^2+ in place of raised digits');

const STYLES = ['plain', 'unicode', 'html', 'latex', 'mathml'] as const satisfies readonly PrintStyle[];
export const styleOption = new Option(
  '--style <STYLE>',
  'how formulas are written; html, latex and mathml give the formulas alone, one a line, to be pasted: --style latex',
)
  .choices(STYLES)
  .conflicts(['plain', 'json']);
export const foldOption = new Option('--fold-hydronium', 'read every H3O^+ as H^+ and H2O, so that the two can cancel');

/** Options of every ask that balances. */
export const mediumOption = new Option(
  '--medium <NAME>',
  'acid, base, neutral, none or a melt: --medium molten-chloride',
);
export const helpersOption = new Option(
  '--helpers <LIST>',
  'exactly these helpers instead: --helpers "CN^-, H2O, OH^-"',
)
  .argParser<readonly string[]>(helperList)
  .conflicts('medium');
export const settleOption = new Option(
  '--settle <ASSUMPTION>',
  'which of several balances is meant: the text that the fault offered, such as --settle "if H2O2 is only oxidised, to O2"',
);

export const perOption = new Option(
  '--per <WHAT>',
  'scale the answer to one electron or one mole of a species: --per electron, --per "Cu"',
);
export const irreducibleOption = new Option(
  '--irreducible',
  'where several balances exist, list every irreducible whole one (the Hilbert basis)',
);

/** What the options of scale, folding and listing say. */
export interface RequestOptions {
  readonly per?: string | undefined;
  readonly irreducible?: true | undefined;
  readonly foldHydronium?: true | undefined;
}

/** What the common options say. */
export interface CommonOptions extends Showing {
  readonly where?: Pairs | undefined;
  readonly define?: Pairs | undefined;
  readonly strict?: true | undefined;
}

/** What the balancing options say. */
export interface BalancingOptions {
  readonly medium?: string | undefined;
  readonly helpers?: readonly string[] | undefined;
  readonly settle?: string | undefined;
}

type Fields = Readonly<Record<string, unknown>>;

/** Fields without those that were not given. */
export const given = (fields: Fields): Fields =>
  Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== undefined));

/** The fields of an ask that the common options fill. */
export const commonFields = ({ where, define, strict }: CommonOptions): Fields => given({ where, define, strict });

/** The fields of an ask that the options of scale, folding and listing fill. */
export const requestFields = ({ per, irreducible, foldHydronium }: RequestOptions): Fields =>
  given({ per, irreducible, foldHydronium });

/** The fields of an ask that the balancing options fill. */
export const balancingFields = ({ medium, helpers, settle }: BalancingOptions): Fields =>
  given({ medium: helpers === undefined ? medium : { helpers }, settle });
