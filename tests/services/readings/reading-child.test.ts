import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { afterEach, expect, test } from 'vitest';

import { recordOfSolution } from '@/db/seed/furnace-record';
import { ReadingChild, USUAL_READING_LIMITS } from '@/lib/readings/reading-child';

import { TODAY } from '../../factories/world';

const ASKED = {
  requirement: { set: 920, tolerance: 10, unit: 'F' as const, soakMinutes: 35 },
  corrections: {},
};
const chart = (bytes: Buffer) => ({ kind: 'chart' as const, name: 'load.csv', bytes, ask: ASKED });
const small = () => chart(recordOfSolution({ endedAt: TODAY, soakedMin: 40 }));

/** Weeks of readings in one file: nobody reads it in the blink of an eye, or without memory. */
const huge = () => {
  const [head = '', rows = ''] = recordOfSolution({ endedAt: TODAY, soakedMin: 40 })
    .toString()
    .split(/(?<=TC3 F\n)/);
  return chart(Buffer.from(head + rows.repeat(300)));
};

let child: ReadingChild | null = null;
afterEach(() => child?.close());

/** A process with limits that can be changed between two files. */
function startChild(limits: Partial<typeof USUAL_READING_LIMITS>) {
  const kept = { ...USUAL_READING_LIMITS, ...limits };
  child = new ReadingChild(kept);
  return { child, widen: () => Object.assign(kept, USUAL_READING_LIMITS) };
}

test.each([
  ['time', { milliseconds: 20 }, { code: 'took_too_long', message: /took longer than .* Read it by eye\./ }],
  ['memory', { bytes: 1024 ** 2 }, { code: 'too_large', message: /needs more memory .* Read it by eye\./ }],
])(
  'a file that takes more %s than it may is ended, and the next is read all the same',
  async (_, limits, fault) => {
    const { child: reading, widen } = startChild(limits);
    expect(await reading.read(huge())).toEqual({
      fault: { code: fault.code, message: expect.stringMatching(fault.message) as string },
    });
    widen();
    expect(await reading.read(small())).toMatchObject({ content: { judged: { verdict: 'pass' } } });
  },
);

/** The reading processes that this test started, as the system lists them. */
async function readingPids(): Promise<number[]> {
  const { stdout } = await promisify(execFile)('ps', ['-o', 'pid=,args=', '--ppid', String(process.pid)]);
  return stdout
    .split('\n')
    .filter((line) => line.includes('reading-process'))
    .map((line) => Number.parseInt(line, 10));
}

test('a file at which the process dies says so, and the next is read all the same', async () => {
  const { child: reading } = startChild({});
  const broken = reading.read(huge());
  for (const pid of await readingPids()) process.kill(pid, 'SIGKILL');
  expect(await broken).toMatchObject({
    fault: {
      code: 'damaged',
      message: 'This file broke the reading off. Read it by eye, or ask for it again.',
    },
  });
  expect(await reading.read(small())).toMatchObject({ content: { judged: { verdict: 'pass' } } });
});

test('a file that cannot be read leaves the process to the next', async () => {
  const { child: reading } = startChild({});
  expect(await reading.read(chart(Buffer.from('Dear Sir, the chart follows by post.\n')))).toMatchObject({
    fault: { code: expect.any(String) as string, message: expect.stringMatching(/\.$/) as string },
  });
  expect(await reading.read(small())).toMatchObject({ content: { judged: { verdict: 'pass' } } });
});

test('after it was closed it is started again for the next file', async () => {
  const { child: reading } = startChild({});
  await reading.read(small());
  reading.close();
  expect(await reading.read(small())).toMatchObject({ content: { judged: { verdict: 'pass' } } });
});

test('what is wrong with the request itself is thrown, so that the job is tried again', async () => {
  const { child: reading } = startChild({});
  const { ask: _, ...unasked } = small();
  await expect(reading.read(unasked)).rejects.toThrow('held against something');
});
