import type { Lexer, Token } from 'moo';
import nearley from 'nearley';
import { type Result, failure, success } from '../report/result.ts';
import { diagnose } from './diagnose.ts';
import grammar from './generated/species.ts';
import { lexer, tokensOf } from './lexer.ts';
import { overLimit } from './over-limit.ts';
import type { SpeciesSyntax } from './syntax.ts';

const RULES = nearley.Grammar.fromCompiled(grammar);

/** What a parser reads: tokens already cut, so that a text is lexed once and no lexer is shared between parsers. */
const replay = (tokens: readonly Token[]): nearley.Lexer => {
  let next = 0;
  return {
    reset: () => {
      next = 0;
    },
    next: () => tokens[next++],
    save: () => ({ line: 1, col: 1 }),
    formatError: () => '',
  };
};

/** The readings, or the index of the first token that no reading can take (their number: the text ends too soon). */
const parse = (tokens: readonly Token[]): readonly SpeciesSyntax[] | number => {
  const parser = Object.assign(new nearley.Parser(RULES, { lexer: replay(tokens) }), { reportError: () => '' });
  try {
    parser.feed('');
  } catch (thrown) {
    const offset = thrown instanceof Error && 'offset' in thrown ? thrown.offset : 0;
    return typeof offset === 'number' ? offset : 0;
  }
  return parser.results.length === 0 ? tokens.length : (parser.results as readonly SpeciesSyntax[]);
};

/**
 * Every way to read `text` as one species, in no order. Faults: `empty`, `too-long`, `too-hard` and the codes of
 * reading, each with its span in code points of `text`.
 */
export const parseSpecies = (text: string, source: Lexer = lexer): Result<readonly SpeciesSyntax[]> => {
  const tooMuch = overLimit(text);
  if (tooMuch !== null) return failure(tooMuch);
  const tokens = tokensOf(text, source);
  const first = tokens.findIndex(({ type }) => type !== 'space');
  if (first < 0) return failure({ code: 'empty', message: 'nothing is written', span: { from: 0, to: 0 } });
  const last = tokens.findLastIndex(({ type }) => type !== 'space');
  const kept = tokens.slice(first, last + 1);
  const readings = parse(kept);
  return typeof readings === 'number' ? failure(diagnose(text, kept, readings)) : success(readings);
};
