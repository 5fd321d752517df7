import { Argument, Command, type CommandUnknownOpts } from '@commander-js/extra-typings';
import { type Shell, examples } from './shell.ts';

/** `schema`: JSON Schema of a sheet, an ask, an answer or a record. */
export const schemaCommand = (shell: Shell): CommandUnknownOpts =>
  new Command('schema')
    .description('JSON Schema of a sheet, for editors that complete it, of asks, answers, or a record')
    .addArgument(
      new Argument('<what>', 'what the schema describes').choices(['sheet', 'asks', 'answers', 'record'] as const),
    )
    .addHelpText('after', examples('couplet schema sheet > sheet.schema.json', 'couplet schema asks'))
    .action(async (what) => {
      const { publishedSchema } = await import('../desk/schema/published.ts');
      await shell.world.out(`${JSON.stringify(publishedSchema(what), null, 2)}\n`);
    });
