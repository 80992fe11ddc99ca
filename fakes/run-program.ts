import { pathToFileURL } from 'node:url';

interface Running {
  close(): Promise<void>;
}

/** True when the file was started by name, false when it was imported by a test. */
export function isProgram(moduleUrl: string): boolean {
  const started = process.argv[1];
  return started !== undefined && moduleUrl === pathToFileURL(started).href;
}

/** Runs a stand-in as a process: one line when it is up, a clean end on a signal, one sentence and exit code 1 if it cannot start. */
export async function runProgram(
  name: string,
  start: () => Promise<Running & { address: string }>,
): Promise<void> {
  try {
    const running = await start();
    process.stdout.write(`${name} stands in at ${running.address}\n`);
    let isEnding = false;
    const end = () => {
      if (isEnding) return;
      isEnding = true;
      running.close().then(
        () => process.exit(0),
        () => process.exit(1),
      );
    };
    process.on('SIGTERM', end);
    process.on('SIGINT', end);
  } catch (error) {
    process.stderr.write(`${name} cannot start: ${error instanceof Error ? error.message : String(error)}\n`);
    process.exit(1);
  }
}

/** A port from the environment; refuses what is not one, because a silent default would listen where nobody looks. */
export function portFromEnv(name: string, fallback: number): number {
  const value = process.env[name];
  if (value === undefined || value === '') return fallback;
  const port = Number(value);
  if (!Number.isInteger(port) || port < 0 || port > 65535)
    throw new Error(`${name} must be a port number, not "${value}".`);
  return port;
}
