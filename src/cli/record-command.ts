import { Command, type CommandUnknownOpts, Option } from '@commander-js/extra-typings';
import { jsonOption } from './options.ts';
import { type Shell, examples } from './shell.ts';

const decimalOption = new Option('--decimal <SIGN>', 'the decimal sign; left out, the first number shows it').choices([
  'point',
  'comma',
] as const);
const ruleOption = new Option('--rule <RULE>', 'straight lines between readings, or each held until the next')
  .choices(['trapezoid', 'hold'] as const)
  .default('trapezoid' as const);
const gapChargeOption = new Option('--gap-charge <WHAT>', 'count charge across gaps as across any step, or skip it')
  .choices(['count', 'skip'] as const)
  .default('count' as const);

/** `record`: the charge of a logged current. */
export const recordCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('record')
    .description('the charge of a current record: a text with a column of time and one of current')
    .argument('<file>', 'the record; - for standard input')
    .option('--time <COLUMN>', 'the column of time, by name or number')
    .option('--current <COLUMN>', 'the column of current, by name or number')
    .option('--time-unit <UNIT>', 'the unit of time where the header has none')
    .option('--current-unit <UNIT>', 'the unit of current where the header has none')
    .addOption(decimalOption)
    .addOption(ruleOption)
    .option('--gap <LIMIT>', 'a step longer than this is a gap: a time, or a number of usual steps (10 left out)')
    .addOption(gapChargeOption)
    .option('--zero <CURRENT>', 'a current of this size or less is a pause (0 A left out)')
    .addOption(jsonOption)
    .addHelpText(
      'after',
      examples(
        'couplet record tank-a.csv',
        'couplet record tank-a.csv --time "Elapsed (min)" --current "Rectifier [A]"',
        'couplet record tank-a.txt --time 1 --current 3 --time-unit s --current-unit mA',
        'couplet record tank-a.csv --rule hold --gap "30 s" --gap-charge skip',
        'couplet record tank-a.csv --decimal comma --gap 20 --zero "50 mA"',
        'couplet record - --json < tank-a.csv',
      ),
    )
    .action(async (file, { json, ...options }) => {
      const { showRecord } = await import('./record.ts');
      shell.finish(await showRecord(file, options, { json }, shell.world));
    });
