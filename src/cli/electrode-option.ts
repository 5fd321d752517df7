import { Option } from '@commander-js/extra-typings';
import { collect, given } from './options.ts';

type Fields = Readonly<Record<string, unknown>>;

/** "Ni^2+ -> Ni @ 95 %": behind the last " @ " stands the share of the electrode's current; before a number the blank may go. */
const SHARED = /^(.*\S)(?:\s+@\s*(?=\S)|\s*@\s*(?=[\d.]+(?:\/\d+)?\s*%?\s*$))(.*)$/s;

/** A reaction as it was typed, with its share where one is given; `medium` is that of its electrode. */
export const reactionFields = (typed: string, textField: 'skeleton' | 'half', medium?: string): Fields => {
  const [, text = typed, share] = SHARED.exec(typed) ?? [];
  return given({ [textField]: text, share, medium });
};

/** A reaction of a cell; text alone where nothing else is said. */
const reaction = (typed: string, medium: string | undefined): unknown => {
  const fields = reactionFields(typed, 'skeleton', medium);
  return Object.keys(fields).length === 1 ? fields['skeleton'] : fields;
};

export const anodeOption = new Option(
  '--anode <REACTION>',
  'a reaction at the anode, its share behind it where it has one: --anode "H2O -> O2 @ 95 %"; repeatable',
).argParser<readonly string[]>(collect);
export const cathodeOption = new Option(
  '--cathode <REACTION>',
  'a reaction at the cathode: --cathode "Cu^2+ -> Cu"; repeatable',
).argParser<readonly string[]>(collect);
export const anodeMediumOption = new Option(
  '--anode-medium <NAME>',
  'the medium at the anode, where the two differ: --anode-medium acid',
);
export const cathodeMediumOption = new Option(
  '--cathode-medium <NAME>',
  'the medium at the cathode: --cathode-medium base',
);
export const separatorOption = new Option('--separator', 'the two electrolytes do not mix: nothing folds to water');
export const diagramOption = new Option(
  '--diagram <DIAGRAM>',
  'a cell diagram instead: --diagram "Zn | Zn^2+ || Cu^2+ | Cu"',
).conflicts(['anode', 'cathode', 'anodeMedium', 'cathodeMedium', 'separator', 'medium', 'helpers']);

/** What the options of a cell say. */
export interface CellOptions {
  readonly anode?: readonly string[] | undefined;
  readonly cathode?: readonly string[] | undefined;
  readonly anodeMedium?: string | undefined;
  readonly cathodeMedium?: string | undefined;
  readonly separator?: true | undefined;
  readonly diagram?: string | undefined;
}

/** The fields of a cell that its options fill. */
export const cellFields = (options: CellOptions): Fields =>
  given({
    anode: options.anode?.map((typed) => reaction(typed, options.anodeMedium)),
    cathode: options.cathode?.map((typed) => reaction(typed, options.cathodeMedium)),
    separator: options.separator,
    diagram: options.diagram,
  });

/** What is missing for a cell, in words; null where it is whole. */
export const missingOfCell = (options: CellOptions): string | null => {
  if (options.diagram !== undefined) return null;
  const missing = [options.anode === undefined ? '--anode' : '', options.cathode === undefined ? '--cathode' : ''];
  const names = missing.filter((name) => name !== '').join(' and ');
  return names === '' ? null : `A cell needs ${names}, or --diagram.`;
};
