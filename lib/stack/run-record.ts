import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { CannotStart } from '@/db/cannot-start';
import { isAlive, startedAt } from '@/db/process-identity';
import type { StackSettings } from './settings';

interface Identity {
  readonly pid: number;
  readonly startedAt: string | null;
}

interface Claim {
  /** Remembers a process, so that the next start can end it if this one is killed before it can. */
  remember(pid: number): void;
  release(): void;
}

/** One stack at a time in one folder. What a killed predecessor left running is ended first. */
export async function claimRun(
  { kind, dataFolder }: StackSettings,
  report: (line: string) => void,
): Promise<Claim> {
  const what = kind === 'test' ? 'A test run is going on' : 'Lotwright already runs';
  const file = join(dataFolder, 'run.json');
  const [previous, ...parts] = readRecord(file);
  if (previous && isSame(previous)) {
    throw new CannotStart(`${what} from this folder, as process ${previous.pid}: stop that one first.`);
  }
  const leftOver = parts.filter(isSame);
  if (leftOver.length > 0) {
    report(`Ending ${leftOver.length} processes that a killed start left behind …`);
    await Promise.all(leftOver.map(endLeftOver));
  }

  mkdirSync(dataFolder, { recursive: true });
  const record = [identityOf(process.pid)];
  const write = () => writeFileSync(file, JSON.stringify(record));
  write();
  return {
    remember(pid) {
      record.push(identityOf(pid));
      write();
    },
    release: () => rmSync(file, { force: true }),
  };
}

function readRecord(file: string): Identity[] {
  if (!existsSync(file)) return [];
  try {
    return JSON.parse(readFileSync(file, 'utf8')) as Identity[];
  } catch {
    // Half written: its writer was killed.
    return [];
  }
}

const identityOf = (pid: number): Identity => ({ pid, startedAt: startedAt(pid) });

const isSame = ({ pid, startedAt: began }: Identity) => isAlive(pid) && startedAt(pid) === began;

async function endLeftOver(identity: Identity): Promise<void> {
  for (const signal of ['SIGTERM', 'SIGKILL'] as const) {
    try {
      process.kill(-identity.pid, signal);
    } catch {
      return;
    }
    for (let waited = 0; waited < 5_000 && isSame(identity); waited += 100) {
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    if (!isSame(identity)) return;
  }
}
