import { Command, type CommandUnknownOpts } from '@commander-js/extra-typings';
import { amountsCommand } from './amounts-command.ts';
import { auditCommand } from './audit-command.ts';
import { halfCommand, redoxCommand } from './balancing-commands.ts';
import { batchCommand, sheetCommand } from './file-commands.ts';
import { cellCommand } from './cell-command.ts';
import { equationCommand, speciesCommand } from './reading-commands.ts';
import { recordCommand } from './record-command.ts';
import { schemaCommand } from './schema-command.ts';
import { type Shell, UNQUOTED, examples } from './shell.ts';
import { tableCommand } from './table-command.ts';
import { VERSION } from './version.ts';

const AFTER = `${examples(
  'couplet half "MnO4^- -> Mn^2+" --medium acid',
  'couplet cell --anode "H2O -> O2" --cathode "Cu^2+ -> Cu"',
  'couplet audit "2 H2 + O2 -> 2 H2O"',
  'couplet sheet fixtures/tern-quay.yaml',
)}
Charges are written with a caret: Cu^2+, SO4^2-; the electron is e^-.
Exit codes: 0 answered; 1 a fault, or an audit that is unbalanced or found
nothing to audit; 2 the command itself was wrong.
couplet COMMAND --help shows the options and examples of a command.
`;

/** How the parser of the line begins when words are left over. */
const TOO_MANY = /^error: too many arguments/;

/** The line and its errors go to the world; nothing ends the process. */
const bound = (command: CommandUnknownOpts, { world }: Shell): CommandUnknownOpts =>
  command
    .exitOverride()
    .showHelpAfterError('Add --help for the options and examples.')
    .configureOutput({
      writeOut: (text) => void world.out(text),
      writeErr: (text) => {
        world.err(text);
      },
      outputError: (text, write) => {
        write(TOO_MANY.test(text) ? `${text}${UNQUOTED}\n` : text);
      },
      getOutHelpWidth: () => 80,
      getErrHelpWidth: () => 80,
      getOutHasColors: () => false,
      getErrHasColors: () => false,
    });

/** "table [half-reactions...]": that it has options is said once below, not in every line. */
const termOf = (command: CommandUnknownOpts): string =>
  [command.name(), command.usage().replace('[options]', '').trim()].join(' ').trim();

/** All commands. */
export const program = (shell: Shell): CommandUnknownOpts => {
  const root = new Command('couplet')
    .description(
      'Balances electrode reactions exactly, composes cells, audits equations, and finds charge, mass and gas.',
    )
    .version(VERSION, '--version', 'print the version')
    .helpOption('-h, --help', 'show this help')
    .helpCommand('help [command]', 'show the help of a command')
    .configureHelp({ subcommandTerm: termOf })
    .addHelpText('after', AFTER);
  bound(root, shell);
  const commands = [
    halfCommand(shell),
    redoxCommand(shell),
    cellCommand(shell),
    auditCommand(shell),
    amountsCommand(shell),
    speciesCommand(shell),
    equationCommand(shell),
    sheetCommand(shell),
    tableCommand(shell),
    recordCommand(shell),
    batchCommand(shell),
    schemaCommand(shell),
  ];
  for (const command of commands) root.addCommand(bound(command.helpOption('-h, --help', 'show this help'), shell));
  return root;
};
