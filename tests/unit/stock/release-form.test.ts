import { expect, test } from 'vitest';

import {
  allThatMay,
  atFormLine,
  chosenOf,
  ReleaseForm,
  releaseOf,
  releaseWords,
  type ReleaseFormIn,
} from '@/components/stock/release-form';
import type { GateLine } from '@/lib/stock/contract';

type Line = ReleaseFormIn['lines'][number];
const line = (part: Partial<Line> = {}): Line => ({
  lineId: 'l1',
  lineNo: 1,
  mayPass: 10,
  goesOn: false,
  isNamed: false,
  pieces: '10',
  names: [],
  locationId: 'shelf',
  ...part,
});
const faultsOf = (part: Partial<Line>) =>
  ReleaseForm.safeParse({ lines: [line(part)] }).error?.issues.map((issue) => issue.path.join('.')) ?? [];

test('at most what may pass, and to a place', () => {
  expect(faultsOf({})).toEqual([]);
  expect(faultsOf({ pieces: '11' })).toEqual(['lines.0.pieces']);
  expect(faultsOf({ locationId: '' })).toEqual(['lines.0.locationId']);
});

test('what goes on to another step, and a line of which nothing is taken, need no place', () => {
  expect(faultsOf({ locationId: '', goesOn: true })).toEqual([]);
  expect(faultsOf({ locationId: '', pieces: '' })).toEqual([]);
});

test('of named pieces the ticked names are the count', () => {
  expect(faultsOf({ isNamed: true, names: ['a', 'b'], mayPass: 1 })).toEqual(['lines.0.pieces']);
});

test('what is sent leaves out lines of which nothing is taken', () => {
  const read = ReleaseForm.parse({
    lines: [
      line({ pieces: '' }),
      line({ lineId: 'l2', goesOn: true }),
      line({ lineId: 'l3', isNamed: true, names: ['a'] }),
    ],
  });
  expect(releaseOf('b1', read)).toEqual({
    batchId: 'b1',
    lines: [
      { lineId: 'l2', pieces: 10, locationId: null },
      { lineId: 'l3', pieces: 1, locationId: 'shelf', pieceIds: ['a'] },
    ],
  });
});

test('a refusal comes back to the row it was typed in', () => {
  const form = { lines: [line({ pieces: '' }), line({ lineId: 'l2' })] };
  const sent = releaseOf('b1', ReleaseForm.parse(form));
  expect(atFormLine({ field: 'lines.0.locationId', message: 'closed' }, sent, form)).toEqual({
    field: 'lines.1.locationId',
    message: 'closed',
  });
  expect(atFormLine({ field: 'batchId', message: 'gone' }, sent, form).field).toBe('batchId');
});

test('all that may pass is proposed, the first names of it ticked', () => {
  const gate = {
    lineId: 'l1',
    lineNo: 1,
    mayPass: 1,
    nextProcess: null,
    usualLocationId: null,
    named: [
      { id: 'a', serial: '01' },
      { id: 'b', serial: '02' },
    ],
  } as unknown as GateLine;
  expect(allThatMay([gate]).lines[0]).toMatchObject({
    pieces: '1',
    names: ['a'],
    isNamed: true,
    locationId: '',
  });
});

test('what is being typed and is no number yet counts as none', () => {
  const chosen = chosenOf({
    lines: [line({ pieces: '4' }), line({ pieces: '4x' }), line({ pieces: '3', goesOn: true })],
  });
  expect(chosen).toEqual({ toStock: 4, goingOn: 3 });
});

test.each([
  [{ toStock: 40, goingOn: 0 }, 'Release 40 to stock'],
  [{ toStock: 0, goingOn: 1 }, 'Release 1 to its next step'],
  [{ toStock: 0, goingOn: 15 }, 'Release 15 to their next step'],
  [{ toStock: 25, goingOn: 15 }, 'Release 40: 25 to stock, 15 onward'],
])('%j on the button', (chosen, says) => expect(releaseWords(chosen)).toBe(says));
