import fc from 'fast-check';
import { expect, test } from 'vitest';

import { allocate } from '@/lib/assemblies/allocate';
import { releaseGate, type GateFacts } from '@/lib/stock/gate';

const base: GateFacts = {
  away: 0,
  inQuarantine: 41,
  onHold: 0,
  proved: 41,
  hasNextStep: false,
  paid: true,
  unpaidBatches: [],
};

test('counted, proved, nothing held and paid: all pass', () =>
  expect(releaseGate(base)).toEqual({ mayPass: 41, missing: [] }));

test('a certificate for 40 of 41 lets 40 pass and says so of the one', () =>
  expect(releaseGate({ ...base, proved: 40 })).toEqual({
    mayPass: 40,
    missing: [{ reason: 'not_proved', pieces: 1, detail: [] }],
  }));

test('unpaid pieces do not go to stock, and the gate names the batch', () =>
  expect(releaseGate({ ...base, paid: false, unpaidBatches: ['B-0404'] })).toEqual({
    mayPass: 0,
    missing: [{ reason: 'not_paid', pieces: 41, detail: ['B-0404'] }],
  }));

test('unpaid pieces go on to their next outside step', () =>
  expect(releaseGate({ ...base, paid: false, hasNextStep: true, unpaidBatches: ['B-0404'] }).mayPass).toBe(
    41,
  ));

test('never more pass than are proved and than lie in quarantine', () =>
  fc.assert(
    fc.property(
      fc.record({
        away: fc.nat(50),
        inQuarantine: fc.nat(50),
        onHold: fc.nat(50),
        proved: fc.integer({ min: -20, max: 60 }),
        hasNextStep: fc.boolean(),
        paid: fc.boolean(),
        unpaidBatches: fc.constant([]),
      }),
      (facts) => {
        const { mayPass } = releaseGate(facts);
        expect(mayPass).toBeGreaterThanOrEqual(0);
        expect(mayPass).toBeLessThanOrEqual(Math.min(facts.inQuarantine, Math.max(0, facts.proved)));
        if (!facts.paid && !facts.hasNextStep) expect(mayPass).toBe(0);
      },
    ),
  ));

test('no piece in stock is counted for two assemblies', () =>
  fc.assert(
    fc.property(
      fc.array(
        fc.record({
          assemblyId: fc.uuid(),
          partNumber: fc.constantFrom('A', 'B'),
          pieces: fc.integer({ min: 1, max: 30 }),
          fitted: fc.nat(40),
        }),
      ),
      fc.nat(60),
      fc.nat(60),
      (needs, a, b) => {
        const ready = allocate(
          needs,
          new Map([
            ['A', a],
            ['B', b],
          ]),
        );
        const taken = (part: string) =>
          needs.reduce(
            (sum, need, at) =>
              sum + (need.partNumber === part ? (ready[at] ?? 0) - Math.min(need.fitted, need.pieces) : 0),
            0,
          );
        expect(taken('A')).toBeLessThanOrEqual(a);
        expect(taken('B')).toBeLessThanOrEqual(b);
        needs.forEach((need, at) => expect(ready[at]).toBeLessThanOrEqual(need.pieces));
      },
    ),
  ));
