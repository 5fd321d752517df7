import { Command, type CommandUnknownOpts } from '@commander-js/extra-typings';
import {
  balancingFields,
  commonFields,
  defineOption,
  helpersOption,
  jsonOption,
  mediumOption,
  plainOption,
  settleOption,
  strictOption,
  whereOption,
} from './options.ts';
import { type Shell, examples } from './shell.ts';

/** `half`: a skeleton to its half-reaction. */
export const halfCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('half')
    .description('balance a half-reaction and find its electrons')
    .argument('<skeleton>', 'what reacts -> what forms: "MnO4^- -> Mn^2+"')
    .addOption(mediumOption)
    .addOption(helpersOption)
    .addOption(settleOption)
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet half "MnO4^- -> Mn^2+" --medium acid',
        'couplet half "Zn(OH)4^2- -> Zn" --medium base',
        'couplet half "Cu(CN)2^- -> Cu" --helpers "CN^-"',
        'couplet half "Li1-xCoO2 -> LiCoO2" --helpers "Li^+" --where x=0.4',
      ),
    )
    .action((skeleton, options) =>
      shell.ask({ ask: 'half', skeleton, ...balancingFields(options), ...commonFields(options) }, options),
    );

/** `redox`: a skeleton to its overall reaction and halves. */
export const redoxCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('redox')
    .description('balance a redox reaction and split it into its two halves')
    .argument('<skeleton>', 'what reacts -> what forms: "MnO4^- + Fe^2+ -> Mn^2+ + Fe^3+"')
    .addOption(mediumOption)
    .addOption(helpersOption)
    .addOption(settleOption)
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet redox "Cr2O7^2- + Fe^2+ -> Cr^3+ + Fe^3+" --medium acid',
        'couplet redox "Cl2 -> Cl^- + ClO3^-" --medium base',
        'couplet redox "CN^- + ClO^- -> CNO^- + Cl^-" --medium base --json',
      ),
    )
    .action((skeleton, options) =>
      shell.ask({ ask: 'redox', skeleton, ...balancingFields(options), ...commonFields(options) }, options),
    );
