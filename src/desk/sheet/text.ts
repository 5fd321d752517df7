import { type Document, type Node, isMap, isNode, isScalar, parseDocument, visit } from 'yaml';
import type { Fault } from '../../report/fault.ts';
import { type Result, failure, success } from '../../report/result.ts';
import { type Span, shiftSpan, spanOf } from '../../report/span.ts';
import { fieldName } from '../issue.ts';

/** Characters a sheet may have. */
export const LONGEST_SHEET = 200_000;
/** Levels that brackets, dashes or question marks may open in a sheet; a parser recurses once for each. */
export const DEEPEST_SHEET = 40;
/** How often aliases may repeat what they stand for. */
const MOST_ALIASES = 100;

/** A sheet as read: its value, and where each part of it stands in the text. */
export interface SheetText {
  readonly text: string;
  readonly value: unknown;
  /** The same fault at its place in the sheet: `field` is prefixed with the path, the span counts in the sheet. */
  readonly place: (fault: Fault, path: readonly PropertyKey[]) => Fault;
}

const sheetFault = (code: 'bad-ask' | 'too-long', message: string, span?: Span, hint?: string): Result<never> =>
  failure({
    code,
    field: 'sheet',
    message,
    ...(span === undefined ? {} : { span }),
    ...(hint === undefined ? {} : { hint }),
  });

/** How deep flow brackets go; those inside chemistry are closed again and count for nothing. */
const bracketDepth = (text: string): number => {
  let depth = 0;
  let deepest = 0;
  for (const letter of text) {
    if (letter === '[' || letter === '{') depth += 1;
    else if (letter === ']' || letter === '}') depth = Math.max(0, depth - 1);
    deepest = Math.max(deepest, depth);
  }
  return deepest;
};

const tooDeep = (text: string): boolean =>
  bracketDepth(text) > DEEPEST_SHEET || /(?:[-?][ \t]+){40}/.test(text) || /^ {400}/m.test(text);

const WORDS: Readonly<Record<string, string>> = {
  TAB_AS_INDENT: 'A tab stands where YAML wants spaces.',
  BAD_ALIAS: 'This alias stands for nothing.',
  DUPLICATE_KEY: 'This key stands twice in one place.',
  MULTIPLE_DOCS: 'A sheet is one document.',
  UNEXPECTED_TOKEN: 'This does not fit here.',
  MISSING_CHAR: 'A character is missing here: a colon, a quote or a bracket.',
  BAD_INDENT: 'This line is not indented like its neighbours.',
};

const HINTS: Readonly<Record<string, string>> = {
  TAB_AS_INDENT: 'Indent with spaces.',
  MULTIPLE_DOCS: 'Remove the line ---.',
};

/** Keys that stand twice in one map, found here because the parser compares all pairs. */
const repeatedKey = (document: Document): Node | null => {
  let found: Node | null = null;
  visit(document, {
    Map: (_, map) => {
      const seen = new Set<unknown>();
      for (const { key } of map.items) {
        if (!isScalar(key)) continue;
        if (seen.has(key.value)) found ??= key;
        seen.add(key.value);
      }
    },
  });
  return found;
};

const spanOfNode = (text: string, node: Node): Span => {
  const [from, to] = node.range ?? [0, 0];
  return spanOf(text, from, to);
};

/** The node at `path`, or the nearest one above it. */
const nodeAt = (document: Document, path: readonly PropertyKey[]): Node | null => {
  for (let length = path.length; length >= 0; length -= 1) {
    const node = document.getIn(path.slice(0, length), true);
    if (isNode(node)) return node;
  }
  return null;
};

/** The key of `path` in the map above it: where an unknown field is underlined. */
const keyAt = (document: Document, path: readonly PropertyKey[]): Node | null => {
  const above = document.getIn(path.slice(0, -1), true);
  if (!isMap(above)) return null;
  const key: unknown = above.items.find((pair) => isScalar(pair.key) && pair.key.value === path.at(-1))?.key;
  return isNode(key) ? key : null;
};

/** A span inside a plain scalar counts on from its first character; inside a quoted or folded one the whole is shown. */
const within = (text: string, node: Node, span: Span | undefined): Span => {
  const whole = spanOfNode(text, node);
  const [from, to] = node.range ?? [0, 0];
  const verbatim = isScalar(node) && text.slice(from, to) === node.value;
  return verbatim && span !== undefined ? shiftSpan(span, whole.from) : whole;
};

/** "anode[1].skeleton" as a path: ["anode", 1, "skeleton"]. */
const pathOf = (field: string): readonly PropertyKey[] =>
  [...field.matchAll(/\[(\d+)\]|([^.[\]]+)/g)].map(([, index, name]) =>
    index === undefined ? (name ?? '') : Number(index),
  );

const placer =
  (text: string, document: Document) =>
  (fault: Fault, path: readonly PropertyKey[]): Fault => {
    const full = [...path, ...pathOf(fault.field ?? '')];
    const key = fault.code === 'bad-ask' && fault.span === undefined ? keyAt(document, full) : null;
    const node = key ?? nodeAt(document, full);
    const span =
      node === null
        ? {}
        : { span: firstLine(text, key === null ? within(text, node, fault.span) : spanOfNode(text, key)) };
    return { ...fault, field: full.length === 0 ? 'sheet' : fieldName(full), ...span };
  };

/** A map or list spans many lines: only its first is underlined. */
const firstLine = (text: string, span: Span): Span => {
  const points = Array.from(text);
  const feed = points.indexOf('\n', span.from);
  return feed === -1 || feed >= span.to ? span : { from: span.from, to: Math.max(feed, span.from + 1) };
};

/**
 * Reads the YAML of a sheet; every scalar stays text, so that 0.10 is not made a float.
 * Faults: `too-long`, `bad-ask` with the place for broken YAML, a repeated key, aliases without end.
 */
export const readSheetText = (text: string): Result<SheetText> => {
  if (text.length > LONGEST_SHEET) {
    return sheetFault('too-long', `A sheet may have at most ${String(LONGEST_SHEET)} characters.`);
  }
  if (tooDeep(text)) return sheetFault('bad-ask', 'This sheet is nested too deeply.');
  const document = parseDocument(text, { schema: 'failsafe', prettyErrors: false, uniqueKeys: false });
  const [error] = document.errors;
  if (error !== undefined) {
    const span = spanOf(text, error.pos[0], Math.max(error.pos[1], error.pos[0] + 1));
    return sheetFault(
      'bad-ask',
      WORDS[error.code] ?? 'This is not YAML that can be read.',
      firstLine(text, span),
      HINTS[error.code],
    );
  }
  const repeated = repeatedKey(document);
  if (repeated !== null)
    return sheetFault('bad-ask', 'This key stands twice in one place.', spanOfNode(text, repeated));
  try {
    const value: unknown = document.toJS({ maxAliasCount: MOST_ALIASES });
    return success({ text, value, place: placer(text, document) });
  } catch (problem) {
    if (!(problem instanceof ReferenceError)) throw problem;
    return sheetFault('bad-ask', 'Aliases in this sheet expand without end.', undefined, 'Write the values out.');
  }
};
