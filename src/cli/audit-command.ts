import { Argument, Command, type CommandUnknownOpts, Option } from '@commander-js/extra-typings';
import type { ListFormat } from './audit-list.ts';
import { isMarkup } from './markup-style.ts';
import {
  balancingFields,
  commonFields,
  defineOption,
  foldOption,
  given,
  helpersOption,
  jsonOption,
  mediumOption,
  plainOption,
  requestFields,
  strictOption,
  styleOption,
  whereOption,
} from './options.ts';
import { type Shell, examples } from './shell.ts';

const LIST_FORMATS = ['text', 'markdown', 'csv', 'ndjson'] as const satisfies readonly ListFormat[];
const formatOption = new Option(
  '--format <FORMAT>',
  'how it is reported; csv and ndjson are for a file: --format markdown',
)
  .choices(LIST_FORMATS)
  .default('text' as const);

/** `audit`: one equation, a whole cell, or a file of equations. */
export const auditCommand = (shell: Shell): CommandUnknownOpts => {
  const command = new Command('audit')
    .description('check a hand-balanced equation, a whole cell, or a file of equations')
    .addArgument(new Argument('[equation]', 'the equation with its coefficients: "2 H2 + O2 -> 2 H2O"'))
    .option('--anode <EQUATION>', 'the anode line of a whole cell: --anode "Zn -> Zn^2+ + 2 e^-"')
    .option('--cathode <EQUATION>', 'its cathode line')
    .option('--overall <EQUATION>', 'its claimed overall reaction')
    .option('--electrons <N>', 'its claimed electron number: --electrons 2')
    .option(
      '--file <FILE>',
      'a text with one equation a line ("label: equation", # comments), or CSV; - for standard input',
    )
    .option('--column <NAME>', 'the file is CSV and the equations stand in this column: --column equation')
    .addOption(formatOption)
    .option('--contributions', 'list what each written term puts into the ledger')
    .addOption(mediumOption)
    .addOption(helpersOption)
    .addOption(foldOption)
    .addOption(whereOption)
    .addOption(defineOption)
    .addOption(strictOption)
    .addOption(styleOption)
    .addOption(plainOption)
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet audit "MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 3 H2O"',
        'couplet audit --anode "Zn -> Zn^2+ + 2 e^-" --cathode "Ag^+ + e^- -> Ag" --overall "Zn + 2 Ag^+ -> Zn^2+ + 2 Ag" --electrons 2',
        'couplet audit "MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 3 H2O" --format markdown --contributions',
        'couplet audit "2 H2 + O2 -> H2O" --style latex',
        'couplet audit --file equations.txt --format markdown',
        'couplet audit --file results.csv --column equation --format ndjson',
        'cat equations.txt | couplet audit --file -',
      ),
    );
  return command.action(async (equation, options) => {
    const { anode, cathode, overall, electrons, file, column, format, contributions } = options;
    const { medium } = balancingFields(options);
    const fields = given({ medium, contributions, ...requestFields(options), ...commonFields(options) });
    const whole = given({ anode, cathode, overall, electrons });
    const ways = [equation, file, Object.keys(whole).length > 0 ? whole : undefined].filter((way) => way !== undefined);
    if (ways.length !== 1) command.error('Give an equation, or --anode, --cathode and --overall, or --file.');
    const { json = format === 'ndjson' ? true : undefined, plain, style } = options;
    if (file !== undefined) {
      if (isMarkup(style)) command.error('--style html, latex and mathml are for one equation or a cell.');
      const { auditList } = await import('./audit-list.ts');
      const listFormat = json === true ? 'ndjson' : format;
      shell.finish(await auditList({ path: file, column, format: listFormat, fields, plain, style }, shell.world));
      return;
    }
    if (format === 'csv') command.error('--format csv is for --file.');
    const markdown = format === 'markdown';
    await shell.ask({ ask: 'audit', ...given({ equation }), ...whole, ...fields }, { json, plain, style, markdown });
  });
};
