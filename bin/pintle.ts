import { check } from './commands/check';
import { compileFiles } from './commands/compileFiles';
import { explain } from './commands/explain';
import { printSchema } from './commands/printSchema';
import { runScriptFile } from './commands/runScriptFile';
import { upgrade } from './commands/upgrade';
import { WrongUse } from './commands/WrongUse';
import { writeKit } from './commands/writeKit';

/** What each command is for and how it is written; also the help text. */
const COMMANDS: Readonly<
  Record<string, { readonly usage: string; run(parameters: readonly string[]): number | Promise<number> }>
> = {
  check: { usage: 'check FILE… [--house FILE] [--json]', run: check },
  compile: {
    usage: 'compile FILE… --out DIR [--character NAME] [--params k=v]… [--house FILE] [--json]',
    run: compileFiles,
  },
  run: { usage: 'run SCRIPT [--pose FILE] [--json]', run: runScriptFile },
  upgrade: { usage: 'upgrade A B [--out FILE] [--house FILE]', run: upgrade },
  kit: { usage: 'kit --out DIR', run: writeKit },
  schema: { usage: 'schema [recipe|house]', run: printSchema },
  explain: { usage: 'explain CODE [--json]', run: explain },
};

function printUsage(print: (line: string) => void): void {
  print('Usage: pintle COMMAND …\n');
  for (const { usage } of Object.values(COMMANDS)) print(`  pintle ${usage}`);
  print(
    '\nEnds with 0 when nothing is wrong, 1 when there are errors in the input, 2 when it was called wrongly.',
  );
}

async function main([name, ...parameters]: readonly string[]): Promise<number> {
  if (name === undefined || name === '--help' || name === 'help') {
    printUsage(console.log);
    return name === undefined ? 2 : 0;
  }
  const command = Object.hasOwn(COMMANDS, name) ? COMMANDS[name] : undefined;
  try {
    if (!command) throw new WrongUse(`There is no command "${name}".`);
    return await command.run(parameters);
  } catch (error) {
    if (!(error instanceof WrongUse)) throw error;
    console.error(error.message);
    if (command) console.error(`Usage: pintle ${command.usage}`);
    else printUsage(console.error);
    return 2;
  }
}

// A reader that has seen enough (a pager, `head`) closes the pipe; that is no fault.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
  process.exit();
});

process.exitCode = await main(process.argv.slice(2));
