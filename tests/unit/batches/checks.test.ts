import { expect, test } from 'vitest';

import { approvalStanding, type Approval } from '@/lib/batches/approval';
import type { CheckedLine } from '@/lib/batches/check';
import { checkBatch } from '@/lib/batches/checks';
import { canOverride } from '@/lib/batches/finding';

import { APPROVAL, factsOf, LINE, STEP } from './facts-of-batch';

const step = STEP;
const line = LINE;
const approval: Approval = { ...APPROVAL, processes: ['anodize'] };

type Given = Parameters<typeof factsOf>[1] & { lines?: readonly CheckedLine[] };
const facts = ({ lines, ...given }: Given = {}) => factsOf(lines, given);
const codes = (given: Given) =>
  checkBatch(facts(given)).findings.map((finding) => [finding.level, finding.code]);

test('a batch with nothing wrong says what was looked at', () => {
  const { findings, met } = checkBatch(facts());
  expect(findings).toEqual([]);
  expect(met.length).toBeGreaterThan(8);
});

test.each([
  ['an empty batch', { lines: [] }, 'empty_batch'],
  ['a processor one no longer works with', { processor: { active: false } }, 'processor_inactive'],
  ['no approval', { processor: { approvals: [] } }, 'processor_not_approved'],
  [
    'an approval for another process',
    { processor: { approvals: [{ ...approval, processes: ['cadmium_plate'] }] } },
    'processor_not_approved',
  ],
  [
    'an approval for another specification',
    { processor: { approvals: [{ ...approval, specifications: ['AMS 2471'] }] } },
    'processor_not_approved',
  ],
  [
    'an approval that ended yesterday',
    { processor: { approvals: [{ ...approval, validTo: '2026-06-16' }] } },
    'processor_not_approved',
  ],
  [
    'an approval that begins tomorrow',
    { processor: { approvals: [{ ...approval, validFrom: '2026-06-18' }] } },
    'processor_not_approved',
  ],
  [
    'a withdrawn approval',
    { processor: { approvals: [{ ...approval, withdrawnAt: new Date('2026-06-01') }] } },
    'processor_not_approved',
  ],
  [
    'a line whose route says another step',
    {
      batch: { specificationRevision: 'F' },
      lines: [{ ...line, step: { ...step, specificationRevision: 'E' } }],
    },
    'line_of_other_step',
  ],
] as const)('%s stops it', (_, given, code) => {
  expect(codes(given)).toContainEqual(['stop', code]);
});

test.each([
  [
    'an approval that ends on the day it is wanted back',
    { processor: { approvals: [{ ...approval, validTo: '2026-07-01' }] } },
    'approval_ends_before_back',
  ],
  ['a line that asks for no proof', { lines: [{ ...line, requirements: 0 }] }, 'no_requirement'],
  ['a superseded drawing', { lines: [{ ...line, partSuperseded: true }] }, 'part_superseded'],
  ['no day to be back', { batch: { wantedBackOn: null } }, 'no_wanted_day'],
  ['a day to be back that is today', { batch: { wantedBackOn: '2026-06-17' } }, 'wanted_day_past'],
  ['no price at all', { lines: [{ ...line, unitPriceMinor: 0 }] }, 'no_price'],
] as const)('%s warns, and does not stop it', (_, given, code) => {
  expect(codes(given)).toEqual([['warn', code]]);
});

test('what holds for the whole batch is proof enough for its lines', () => {
  expect(codes({ batch: { requirements: 1 }, lines: [{ ...line, requirements: 0 }] })).toEqual([]);
});

test('a lot minimum alone is a price; a line without one beside priced lines is only noted', () => {
  expect(codes({ batch: { lotMinimumMinor: 100 }, lines: [{ ...line, unitPriceMinor: 0 }] })).toEqual([]);
  expect(codes({ lines: [line, { ...line, id: 'line-2', lineNo: 2, unitPriceMinor: 0 }] })).toEqual([
    ['note', 'line_without_price'],
  ]);
});

test('what stops comes before what warns, and what warns before notes', () => {
  const found = codes({
    batch: { putAsideAt: new Date('2026-06-16'), wantedBackOn: null },
    processor: { approvals: [] },
  });
  expect(found.map(([level]) => level)).toEqual(['stop', 'warn', 'note']);
});

test('an empty batch cannot be let pass, a missing approval can', () => {
  const [empty] = checkBatch(facts({ lines: [] })).findings;
  const [unapproved] = checkBatch(facts({ processor: { approvals: [] } })).findings;
  expect([empty, unapproved].map((finding) => finding !== undefined && canOverride(finding))).toEqual([
    false,
    true,
  ]);
});

test('of several approvals the one that stands longest counts, and a specification is known however it is spaced', () => {
  const longer = { ...approval, reference: 'AP-8', validTo: '2027-01-01', specifications: ['mil prf 8625'] };
  const asked = { process: 'anodize', specification: 'MIL-PRF-8625', on: '2026-06-17' } as const;
  expect(approvalStanding([approval, longer], asked)).toMatchObject({
    state: 'approved',
    approval: { reference: 'AP-8' },
  });
  expect(approvalStanding([], asked)).toEqual({ state: 'none' });
});
