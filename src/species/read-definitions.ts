import { lexer, lexerWith, STATES, tokensOf, UNKNOWN_SUBSCRIPTS } from '../notation/lexer.ts';
import { LIMITS } from '../notation/limits.ts';
import { parseSpecies } from '../notation/parse-species.ts';
import type { Fault } from '../report/fault.ts';
import { type Result, all, chain, failure, inField, success } from '../report/result.ts';
import type { Definitions } from './definitions.ts';
import { type ReadingOptions, readSpecies } from './read-species.ts';
import { chargeNumber } from './read-build.ts';
import { type Species, plainCharge, plainSpecies } from './species.ts';

/** A name as spelled in a definition, and its charge: "EDTA^4-" is EDTA with 4-. */
interface Title {
  readonly name: string;
  readonly charge: string;
}

interface Definition extends Title {
  readonly species: Species;
}

/** Letters and digits, then a charge in any spelling. One digit before a sign belongs to the charge: EDTA4-. */
const TITLE = /^(\p{L}[\p{L}\d]*?)((?:\d?[-+\u2212]+|\^.*|[⁰¹²³⁴-⁹]*[⁺⁻]+)?)$/u;

const badAsk = (title: string, message: string, hint: string): Fault => ({
  code: 'bad-ask',
  message,
  hint,
  field: `define.${title}`,
});

/** True where the name spells a formula without help: CO, Ac, NO3. */
const isFormula = (name: string): boolean =>
  parseSpecies(name).ok && tokensOf(name, lexer).every(({ type }) => type !== 'unknown');

const isReserved = (name: string): boolean =>
  name === 'e' || UNKNOWN_SUBSCRIPTS.includes(name) || STATES.includes(name);

const readTitle = (title: string): Result<Title> => {
  const [, name = '', written = ''] = TITLE.exec(title.trim()) ?? [];
  if (name === '' || name.length > LIMITS.nameLength)
    return failure(
      badAsk(title, `${title} is no name with a charge`, 'a name is letters and digits, then its charge: EDTA^4-'),
    );
  if (isFormula(name))
    return failure(badAsk(title, `${name} already reads as a formula of elements`, 'choose a name that is no formula'));
  if (isReserved(name))
    return failure(badAsk(title, `${name} already has a meaning in formulas`, 'choose a longer name'));
  const parsed = parseSpecies(name + written, lexerWith([name], []));
  if (!parsed.ok) return failure(badAsk(title, `the charge of ${title} cannot be read`, 'write it as EDTA^4-'));
  const charged = parsed.value.find(({ charge }) => charge?.tight === true) ?? parsed.value[0];
  return success({ name, charge: plainCharge(chargeNumber(charged?.charge ?? null)) });
};

const readDefinition = (title: string, formula: string, options: ReadingOptions): Result<Definition> =>
  chain(readTitle(title), ({ name, charge }) =>
    chain(inField(readSpecies(formula, options), `define.${title}`), ({ species }): Result<Definition> => {
      if (species.parts.length !== 1)
        return failure(badAsk(title, `${name} stands for one formula, not for an adduct`, 'define its parts'));
      if (plainCharge(species.charge) === charge) return success({ name, charge, species });
      const written = `${name}${plainCharge(species.charge)}`;
      return failure(badAsk(title, `${title} and ${plainSpecies(species)} differ in charge`, `write ${written}`));
    }),
  );

const repeatedName = (definitions: readonly Definition[]): Definition | undefined =>
  definitions.find(({ name }, at) => definitions.findIndex((other) => other.name === name) < at);

const definitionsOf = (definitions: readonly Definition[]): Definitions => ({
  members: new Map(definitions.map(({ name, species }) => [name, species.parts[0]?.members ?? []])),
  spellings: new Set(definitions.map(({ name, charge }) => name + charge)),
  signature: definitions.map(({ name, charge, species }) => `${name}${charge}=${species.key}`).join(';'),
});

/**
 * The names of an ask: `{"EDTA^4-": "C10H12N2O8^4-"}`. Faults: `bad-ask` for a name that is no name, already reads as a
 * formula, comes twice or differs in charge from its formula; the faults of reading the formula.
 */
export const readDefinitions = (
  record: Readonly<Record<string, string>>,
  options: ReadingOptions = {},
): Result<Definitions> => {
  const entries = Object.entries(record);
  if (entries.length > LIMITS.definitions) {
    const message = `an ask defines at most ${String(LIMITS.definitions)} names`;
    return failure({ code: 'bad-ask', message, field: 'define', hint: 'leave out the names that are not used' });
  }
  return chain(all(entries.map(([title, formula]) => readDefinition(title, formula, options))), (definitions) => {
    const repeated = repeatedName(definitions);
    if (repeated === undefined) return success(definitionsOf(definitions));
    const title = repeated.name + repeated.charge;
    return failure(
      badAsk(title, `${repeated.name} is defined twice`, 'a name has one formula; its charge is written behind it'),
    );
  });
};
