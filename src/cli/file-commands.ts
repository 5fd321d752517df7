import { Command, Option, type CommandUnknownOpts } from '@commander-js/extra-typings';
import { jsonOption, plainOption } from './options.ts';
import { type Shell, examples } from './shell.ts';
import { bytesOf } from './world.ts';

/** `batch`: asks in, answers out, one JSON object a line. */
export const batchCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('batch')
    .description('answer asks from a file or standard input, one JSON object a line, in order')
    .argument('[file]', 'the asks; - or nothing for standard input', '-')
    .addHelpText(
      'after',
      examples(
        'couplet batch asks.ndjson > answers.ndjson',
        `echo '{"ask": "half", "skeleton": "Cu^2+ -> Cu"}' | couplet batch`,
      ),
    )
    .action(async (file) => {
      const { answerBatch } = await import('../batch/batch.ts');
      await answerBatch({ input: bytesOf(shell.world, file), write: shell.world.out });
    });

const formatOption = new Option('--format <FORMAT>', 'how the answers are shown')
  .choices(['text', 'markdown', 'csv', 'json', 'html'] as const)
  .conflicts('json');

const everyOption = new Option(
  '--every <STEM>',
  'write every format at once: STEM.txt, STEM.md, STEM.csv, STEM.json, STEM.html',
).conflicts(['format', 'json']);

/** `sheet`: the tanks of a plant and what their runs make. */
export const sheetCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('sheet')
    .description("a plant's tanks from a YAML file: reactions, electron numbers, what each run makes")
    .argument('<file>', 'the sheet; - for standard input')
    .addOption(plainOption)
    .addOption(jsonOption)
    .addOption(formatOption)
    .addOption(new Option('--out <FILE>', 'write to this file instead of standard output').conflicts('every'))
    .addOption(everyOption)
    .addHelpText(
      'after',
      examples(
        'couplet sheet fixtures/tern-quay.yaml',
        'couplet sheet plant.yaml --format html --out plant.html',
        'couplet sheet plant.yaml --every reports/monday',
      ),
    )
    .action(async (file, options) => {
      const { showSheet } = await import('./sheet.ts');
      shell.finish(await showSheet(file, options, shell.world));
    });
