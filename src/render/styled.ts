import type { Answered, EquationAnswer } from '../desk/schema/answer.ts';
import { ONE, showRational } from '../exact/rational.ts';
import { type PrintStyle, type PrintedTerm, printReaction } from '../notation/print/print.ts';
import type { EquationTerm } from '../species/equation.ts';
import { readEquation } from '../species/read.ts';
import type { Subject } from './answer.ts';
import { styledReaction, styledSpecies } from './spelling.ts';

/** The styles that are pasted into a document, formula by formula. */
export type MarkupStyle = Exclude<PrintStyle, 'plain' | 'unicode'>;

const plainTerm = ({ coefficient, species }: EquationAnswer['left'][number]): string =>
  coefficient === '1' ? species.plain : `${coefficient} ${species.plain}`;

const plainEquation = ({ left, right }: EquationAnswer): string =>
  [left, right].map((side) => side.map(plainTerm).join(' + ')).join(' -> ');

const printedTerm = ({ coefficient, species }: EquationTerm): PrintedTerm => ({
  coefficient: coefficient.equals(ONE) ? '' : showRational(coefficient),
  species,
});

/** An equation as somebody wrote it; what cannot be read without the names of its ask is printed as plain text. */
const written = (text: string, style: MarkupStyle): string => {
  const read = readEquation(text);
  if (!read.ok) return styledReaction(text, style);
  return printReaction({ left: read.value.left.map(printedTerm), right: read.value.right.map(printedTerm) }, style);
};

const auditLines = (
  given: Answered & { readonly ask: 'audit' },
  { text, parts = {} }: Subject,
  style: MarkupStyle,
): readonly string[] => {
  const { answer } = given;
  const audits = 'parts' in answer ? Object.values(answer.parts) : [answer];
  const repairs = audits.flatMap((audit) => audit.repairs.map(({ reaction }) => styledReaction(reaction.plain, style)));
  const texts = [text, ...Object.values(parts)].filter((one) => one !== '');
  return [...texts.map((one) => written(one, style)), ...repairs];
};

const reactionsOf = (given: Answered): readonly string[] => {
  switch (given.ask) {
    case 'half':
      return [given.answer.reaction.plain];
    case 'redox': {
      const { overall, oxidation, reduction } = given.answer;
      return [overall, ...[oxidation, reduction].flatMap((half) => half?.reaction ?? [])].map(({ plain }) => plain);
    }
    case 'cell': {
      const { overall, anode, cathode } = given.answer;
      return [overall, ...[...anode, ...cathode].map(({ reaction }) => reaction)].map(({ plain }) => plain);
    }
    case 'equation':
      return [plainEquation(given.answer)];
    case 'species':
    case 'audit':
    case 'amounts':
      return [];
  }
};

/**
 * The formulas of an answer, one a line, to be pasted into a document: of a half-reaction the reaction, of a redox
 * reaction and of a cell the overall reaction and its halves, of an audit the equation as written and its repairs, the
 * likeliest first.
 */
export const styledLines = (given: Answered, subject: Subject, style: MarkupStyle): readonly string[] => {
  if (given.ask === 'species') return [styledSpecies(given.answer.species.plain, style)];
  if (given.ask === 'audit') return auditLines(given, subject, style);
  return reactionsOf(given).map((plain) => styledReaction(plain, style));
};
