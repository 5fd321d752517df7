import { Command, type CommandUnknownOpts } from '@commander-js/extra-typings';
import {
  balancingFields,
  commonFields,
  defineOption,
  foldOption,
  helpersOption,
  irreducibleOption,
  jsonOption,
  mediumOption,
  perOption,
  plainOption,
  requestFields,
  settleOption,
  strictOption,
  styleOption,
  whereOption,
} from './options.ts';
import { type Shell, examples } from './shell.ts';

/** What tells one balancing command from the other. */
interface Balancing {
  readonly ask: 'half' | 'redox';
  readonly description: string;
  readonly skeleton: string;
  readonly examples: readonly string[];
}

/** A command that balances one skeleton, with every option that a balance can take. */
const balancingCommand = (
  shell: Shell,
  { ask, description, skeleton, examples: shown }: Balancing,
): CommandUnknownOpts =>
  new Command(ask)
    .description(description)
    .argument('<skeleton>', `what reacts -> what forms: "${skeleton}"`)
    .addOption(mediumOption)
    .addOption(helpersOption)
    .addOption(settleOption)
    .addOption(perOption)
    .addOption(irreducibleOption)
    .addOption(foldOption)
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(styleOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText('after', examples(...shown))
    .action((typed, options) =>
      shell.ask(
        { ask, skeleton: typed, ...balancingFields(options), ...requestFields(options), ...commonFields(options) },
        options,
      ),
    );

/** `half`: a skeleton to its half-reaction. */
export const halfCommand = (shell: Shell): CommandUnknownOpts =>
  balancingCommand(shell, {
    ask: 'half',
    description: 'balance a half-reaction and find its electrons',
    skeleton: 'MnO4^- -> Mn^2+',
    examples: [
      'couplet half "MnO4^- -> Mn^2+" --medium acid',
      'couplet half "Zn(OH)4^2- -> Zn" --medium base',
      'couplet half "Cu(CN)2^- -> Cu" --helpers "CN^-"',
      'couplet half "Li1-xCoO2 -> LiCoO2" --helpers "Li^+" --where x=0.4',
      'couplet half "O2 -> H2O" --medium acid --per electron',
      'couplet half "MnO4^- + H3O^+ -> Mn^2+ + H2O" --fold-hydronium',
      'couplet half "MnO4^- -> Mn^2+" --medium acid --style latex',
    ],
  });

/** `redox`: a skeleton to its overall reaction and halves. */
export const redoxCommand = (shell: Shell): CommandUnknownOpts =>
  balancingCommand(shell, {
    ask: 'redox',
    description: 'balance a redox reaction and split it into its two halves',
    skeleton: 'MnO4^- + Fe^2+ -> Mn^2+ + Fe^3+',
    examples: [
      'couplet redox "Cr2O7^2- + Fe^2+ -> Cr^3+ + Fe^3+" --medium acid',
      'couplet redox "Cl2 -> Cl^- + ClO3^-" --medium base',
      'couplet redox "CN^- + ClO^- -> CNO^- + Cl^-" --medium base --json',
      'couplet redox "MnO4^- + Fe^2+ -> Mn^2+ + Fe^3+" --medium acid --per "Fe^2+"',
      'couplet redox "MnO4^- + H2O2 -> Mn^2+ + O2" --medium acid --irreducible',
    ],
  });
