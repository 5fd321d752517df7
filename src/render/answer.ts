import type { Answered } from '../desk/schema/answer.ts';
import { amountsBlocks } from './amounts.ts';
import { type WrittenParts, cellAuditBlocks, equationAuditBlocks } from './audit.ts';
import { page } from './block.ts';
import type { Look } from './look.ts';
import { cellBlocks, halfBlocks, redoxBlocks } from './reactions.ts';
import { absenceLines, cautionLines, graveLines, noteLines } from './remarks.ts';
import { equationBlocks, speciesBlocks } from './species.ts';

/** What the answer is about, as the person wrote it: the equation of an audit, the species of amounts. */
export interface Subject {
  readonly text: string;
  /** The equations of the audit of a whole cell. */
  readonly parts?: WrittenParts;
}

const blocksOf = (given: Answered, subject: Subject, look: Look): readonly (readonly string[])[] => {
  switch (given.ask) {
    case 'species':
      return speciesBlocks(given.answer, look);
    case 'equation':
      return equationBlocks(given.answer, look);
    case 'half':
      return halfBlocks(given.answer, look);
    case 'redox':
      return redoxBlocks(given.answer, look);
    case 'cell':
      return cellBlocks(given.answer, look);
    case 'audit':
      return 'parts' in given.answer
        ? cellAuditBlocks(given.answer, subject.parts ?? {}, look)
        : equationAuditBlocks(given.answer, subject.text, look);
    case 'amounts':
      return amountsBlocks(given.answer, subject.text, look);
  }
};

/** Notes and cautions alone, the grave first; "" where there are none. */
export const renderRemarks = ({ notes, cautions }: Answered, look: Look): string => {
  const blocks = [
    graveLines(cautions, look),
    noteLines(notes, look),
    cautionLines(cautions, look),
    absenceLines(cautions, look),
  ];
  return blocks.some((block) => block.length > 0) ? page(blocks) : '';
};

/** An answer as a page of text for a person: grave cautions, the result, how it comes about, notes, other cautions. */
export const renderAnswer = (given: Answered, subject: Subject, look: Look): string =>
  page([
    graveLines(given.cautions, look),
    ...blocksOf(given, subject, look),
    noteLines(given.notes, look),
    cautionLines(given.cautions, look),
    absenceLines(given.cautions, look),
  ]);
