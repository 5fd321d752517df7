import { Command, type CommandUnknownOpts, Option } from '@commander-js/extra-typings';
import { unshielded } from './arrow-argument.ts';
import {
  balancingFields,
  commonFields,
  defineOption,
  helpersOption,
  jsonOption,
  mediumOption,
  plainOption,
  strictOption,
  whereOption,
} from './options.ts';
import { type Shell, UNQUOTED, examples } from './shell.ts';

const formatOption = new Option('--format <FORMAT>', 'how the table is written: --format markdown')
  .choices(['text', 'markdown', 'csv'] as const)
  .default('text' as const);

/** `table`: what people pin to the wall. */
export const tableCommand = (shell: Shell): CommandUnknownOpts => {
  const command = new Command('table')
    .description('a table for the wall: electrons per mole and kilogram, g/(A h), A h/kg, mL of gas per A min')
    .argument('[half-reactions...]', 'each "Cu^2+ -> Cu", or "Cu: Cu^2+ -> Cu" for one of its species only')
    .option('--file <FILE>', 'a text with one of these a line, # comments; - for standard input: --file baths.txt')
    .addOption(formatOption)
    .option('--temperature <T>', 'of the gas, 0 °C if left out: --temperature "25 °C"')
    .option('--pressure <P>', 'of the dry gas, 101.325 kPa if left out: --pressure "1 bar"')
    .addOption(mediumOption)
    .addOption(helpersOption)
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet table "Cu^2+ -> Cu" "Zn^2+ -> Zn" "Ag^+ -> Ag"',
        'couplet table "H2: H2O -> H2" "O2: OH^- -> O2" --medium base --temperature "25 °C"',
        'couplet table --file baths.txt --format markdown',
        'couplet table --file baths.txt --format csv > wall.csv',
      ),
    );
  return command.action(async (typed, options) => {
    const { file, format, temperature, pressure, json, plain } = options;
    if (typed.length === 0 && file === undefined) command.error('Give half-reactions, or --file.');
    const lines = typed.map((line) => String(unshielded(line)));
    if (lines.some((line) => /^[-=+→⇌>]+$/.test(line))) command.error(UNQUOTED);
    if (json === true && format !== 'text') command.error(`Give --json or --format ${format}, not both.`);
    const { answerTable } = await import('./table.ts');
    const settings = { ...balancingFields(options), ...commonFields(options) };
    const shown = json === true ? 'json' : format;
    shell.finish(
      await answerTable({ lines, file, format: shown, plain, settings, temperature, pressure }, shell.world),
    );
  });
};
