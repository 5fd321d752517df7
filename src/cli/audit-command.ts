import { Argument, Command, type CommandUnknownOpts, Option } from '@commander-js/extra-typings';
import type { PrintStyle } from '../notation/print/print.ts';
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

interface Asked {
  readonly equation?: string | undefined;
  readonly file?: string | undefined;
  readonly column?: string | undefined;
  readonly format: ListFormat;
  readonly contributions?: true | undefined;
  readonly json?: true | undefined;
  readonly style?: PrintStyle | undefined;
  /** The lines of a cell that are given. */
  readonly whole: Readonly<Record<string, unknown>>;
}

/** What a whole cell still needs, in words; null where it is whole, or where none was begun. */
const missingOfWhole = (whole: Asked['whole']): string | null => {
  const missing = ['anode', 'cathode', 'overall'].filter((name) => !(name in whole)).map((name) => `--${name}`);
  const last = missing.pop();
  if (last === undefined || Object.keys(whole).length === 0) return null;
  return `A whole cell needs ${missing.length === 0 ? last : `${missing.join(', ')} and ${last}`} too.`;
};

/** Options that say nothing about a file. */
const wrongForFile = ({ style, contributions, format, json }: Asked): string | null => {
  if (isMarkup(style)) return '--style html, latex and mathml are for one equation or a cell.';
  if (contributions === true && json !== true && format !== 'ndjson')
    return '--contributions is for one equation or a cell; of a file only --format ndjson holds them.';
  return null;
};

/** Options that say nothing without a file. */
const wrongWithoutFile = ({ column, format }: Asked): string | null => {
  if (column !== undefined) return '--column is for --file.';
  return format === 'csv' ? '--format csv is for --file.' : null;
};

/** Why there is nothing to audit, or an option that would be passed over; null where all is well. */
const wrongAudit = (asked: Asked): string | null => {
  const { equation, file, whole, json, format } = asked;
  const ways = [equation !== undefined, file !== undefined, Object.keys(whole).length > 0].filter(Boolean);
  if (ways.length !== 1) return 'Give an equation, or --anode, --cathode and --overall, or --file.';
  if (json === true && (format === 'markdown' || format === 'csv'))
    return `Give --json or --format ${format}, not both.`;
  return missingOfWhole(whole) ?? (file === undefined ? wrongWithoutFile(asked) : wrongForFile(asked));
};

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
    const { anode, cathode, overall, electrons, file, column, format, contributions, style, plain } = options;
    const { medium } = balancingFields(options);
    const fields = given({ medium, contributions, ...requestFields(options), ...commonFields(options) });
    const whole = given({ anode, cathode, overall, electrons });
    const wrong = wrongAudit({ ...options, equation, whole });
    if (wrong !== null) command.error(wrong);
    const json = options.json === true || format === 'ndjson' ? true : undefined;
    if (file !== undefined) {
      const { auditList } = await import('./audit-list.ts');
      const listFormat = json === true ? 'ndjson' : format;
      shell.finish(await auditList({ path: file, column, format: listFormat, fields, plain, style }, shell.world));
      return;
    }
    const markdown = format === 'markdown';
    await shell.ask({ ask: 'audit', ...given({ equation }), ...whole, ...fields }, { json, plain, style, markdown });
  });
};
