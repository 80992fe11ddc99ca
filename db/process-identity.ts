import { existsSync, readFileSync, readlinkSync, realpathSync } from 'node:fs';

interface Expected {
  readonly command: RegExp;
  readonly workingFolder: string;
}

/**
 * Whether a process with this number is running and is the one we mean.
 *
 * Numbers are handed out again, so a number from a file proves nothing until it is compared with what /proc says.
 */
export function isAlive(pid: number, expected?: Expected): boolean {
  if (!Number.isInteger(pid) || pid <= 1) return false;
  try {
    process.kill(pid, 0);
  } catch (error) {
    // EPERM: it lives, and belongs to somebody else.
    if ((error as NodeJS.ErrnoException).code !== 'EPERM') return false;
  }
  if (isZombie(pid)) return false;
  if (!expected || !existsSync('/proc/self/stat')) return true;
  try {
    return (
      expected.command.test(readFileSync(`/proc/${pid}/comm`, 'utf8')) &&
      readlinkSync(`/proc/${pid}/cwd`) === realpathSync(expected.workingFolder)
    );
  } catch {
    return false;
  }
}

/** When a process began, in ticks since the machine did: with its number, this names one process for good. */
export function startedAt(pid: number): string | null {
  return statFields(pid)?.[19] ?? null;
}

function isZombie(pid: number): boolean {
  return statFields(pid)?.[0] === 'Z';
}

/** The fields after the command's name, which may itself contain spaces and brackets. */
function statFields(pid: number): string[] | undefined {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  } catch {
    return undefined;
  }
}
