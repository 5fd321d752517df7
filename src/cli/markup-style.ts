import type { PrintStyle } from '../notation/print/print.ts';
import type { MarkupStyle } from '../render/styled.ts';

/** True for a style that gives the formulas alone, to be pasted. */
export const isMarkup = (style: PrintStyle | undefined): style is MarkupStyle =>
  style !== undefined && style !== 'plain' && style !== 'unicode';
