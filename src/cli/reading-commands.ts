import { Command, type CommandUnknownOpts } from '@commander-js/extra-typings';
import {
  commonFields,
  defineOption,
  foldOption,
  jsonOption,
  plainOption,
  requestFields,
  strictOption,
  styleOption,
  whereOption,
} from './options.ts';
import { type Shell, examples } from './shell.ts';

/** `species`: how a spelling is read. */
export const speciesCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('species')
    .description('how a spelling is read: atoms, charge, molar mass, oxidation numbers')
    .argument('<text>', 'a species: "Cr2O7^2-"')
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(styleOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet species "CuSO4*5H2O"',
        'couplet species "Li1-xCoO2" --where x=0.4',
        'couplet species "Cu(EDTA)^2-" --define "EDTA^4-=C10H12N2O8^4-"',
        'couplet species Fe3+ --strict',
        'couplet species "[Fe(CN)6]^4-" --style html',
      ),
    )
    .action((text, options) => shell.ask({ ask: 'species', text, ...commonFields(options) }, options));

/** `equation`: the terms of an equation, nothing balanced. */
export const equationCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('equation')
    .description('how an equation is read, term by term; nothing is balanced')
    .argument('<text>', 'an equation: "2 H2 + O2 -> 2 H2O"')
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(foldOption)
    .addOption(styleOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet equation "Zn + Cu2+ = Zn2+ + Cu"',
        'couplet equation "Na++Cl- -> NaCl" --strict --json',
        'couplet equation "2 H3O^+ + 2 e^- -> H2 + 2 H2O" --fold-hydronium --style latex',
      ),
    )
    .action((text, options) =>
      shell.ask({ ask: 'equation', text, ...requestFields(options), ...commonFields(options) }, options),
    );
