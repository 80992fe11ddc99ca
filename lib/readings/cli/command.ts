import { print } from './quiet';

import { UnreadableFile } from '@/lib/evidence/page';

import { InputError } from './input';

/** What a command prints when it has nothing to tell. */
function problemOf(error: unknown): { code: string; message: string } {
  if (error instanceof UnreadableFile || error instanceof InputError)
    return { code: error.code, message: error.message };
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  return { code: 'unexpected', message: 'The file could not be read; it may be damaged.' };
}

/** Whatever a reader of pictures keeps open must not keep the command waiting. */
const finish = (document: unknown, exit: number) =>
  print(`${JSON.stringify(document, null, 2)}\n`, () => process.exit(exit));

const fail = (error: unknown) => finish({ error: problemOf(error) }, 2);

/** Runs a command that prints one JSON document: exit 0, or 2 with `{"error": {code, message}}`. */
export async function printResult(command: (args: string[]) => Promise<unknown>): Promise<void> {
  // What a library throws where nobody waits for it.
  process.on('uncaughtException', fail);
  await command(process.argv.slice(2)).then((result) => finish(result, 0), fail);
}
