import { describe, expect, test } from 'vitest';

import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { askedInFigures, type AskedInWords } from '@/lib/readings/asked-in-figures';
import { propose } from '@/lib/readings/propose';

import { NOTHING_STATED } from './nothing-stated';

type Cycle = StatedCertificate['cycles'][number];
const solution = (given: Partial<Cycle>): Cycle => ({
  step: 'solution',
  set_temp: 920,
  unit: 'F',
  soak_start: null,
  soak_end: null,
  minutes: 40,
  ...given,
});

interface Asked extends AskedInWords {
  lineNo?: number;
}

/** Verdict and reason for each of the requirements, in their order. */
function proposed(asked: readonly Asked[], stated: Partial<StatedCertificate>) {
  const { proposals } = propose(
    {
      order: {
        batch: 'B-1',
        po: 'TP-1',
        processor: { name: 'Alder Ridge Heat Treating' },
        process: 'solution_heat_treat_and_age',
        requirements: {},
        lines: [1, 2].map((line) => ({ line, part_number: `MC-110${line}`, qty: 10 })),
      },
      requirements: asked.map(({ lineNo, ...words }, at) => ({
        id: String(at),
        lineNo: lineNo ?? null,
        characteristic: words.characteristic,
        figures: askedInFigures(words),
      })),
    },
    {
      stated: {
        ...NOTHING_STATED,
        certificate_number: 'C-1',
        certificate_date: '2026-06-17',
        purchase_order: 'TP-1',
        signature_present: true,
        conformance_statement: true,
        ...stated,
      },
      file: { sha256: '', recognised: false, pages: [] },
      others: [],
      seen: [],
      today: '2026-06-17',
    },
  );
  return asked.map((_, at) => proposals.find(({ requirementId }) => requirementId === String(at)) ?? null);
}

const TEMPERATURE = { characteristic: 'Solution temperature', limit: '910 to 930', unit: '°F' };
const SOAK = { characteristic: 'Soak', limit: '35 or more', unit: 'min' };
const hardness = (limit: string, lineNo?: number): Asked => ({
  characteristic: 'Hardness',
  limit,
  unit: '',
  ...(lineNo !== undefined && { lineNo }),
});

test('a soak that is too short is not met because the temperature was right', () => {
  const [temperature, soak] = proposed([TEMPERATURE, SOAK], { cycles: [solution({ minutes: 20 })] });
  expect(temperature).toMatchObject({ verdict: 'meets', stated: '920 °F' });
  expect(soak).toMatchObject({ verdict: 'does_not_meet', stated: '20 min' });
});

test('a temperature that is wrong is not met because the soak was long enough', () => {
  const [soak, temperature] = proposed([SOAK, TEMPERATURE], { cycles: [solution({ set_temp: 940 })] });
  expect(temperature).toMatchObject({ verdict: 'does_not_meet' });
  expect(soak).toMatchObject({ verdict: 'meets' });
});

test('a requirement of temperature and time is met when both are, and says both', () => {
  const both = { characteristic: 'Solution', limit: '910 to 930 °F, 35 min or more', unit: '' };
  expect(proposed([both], { cycles: [solution({})] })).toMatchObject([
    { verdict: 'meets', stated: '920 °F, 40 min' },
  ]);
  expect(proposed([both], { cycles: [solution({ minutes: 20 })] })).toMatchObject([
    { verdict: 'does_not_meet' },
  ]);
  expect(proposed([both], { cycles: [solution({ minutes: null })] })).toMatchObject([
    { verdict: 'not_stated' },
  ]);
});

test('of two loads the short one decides', () => {
  expect(proposed([SOAK], { cycles: [solution({}), solution({ minutes: 22 })] })).toMatchObject([
    { verdict: 'does_not_meet', stated: '40 min, 22 min' },
  ]);
});

test('what one line asks changes nothing for the batch or for another line', () => {
  const readings = [{ kind: 'hardness', unit: 'HRB', values: [58] }];
  const asked = [hardness('HRB 63 or more'), hardness('HRB 50 or more', 1), hardness('HRB 60 or more', 2)];
  const expected = [{ verdict: 'does_not_meet' }, { verdict: 'meets' }, { verdict: 'does_not_meet' }];
  expect(proposed(asked, { readings })).toMatchObject(expected);
  expect(proposed(asked.toReversed(), { readings })).toMatchObject(expected.toReversed());
});

test('what is not stated is proposed as not stated', () => {
  expect(proposed([TEMPERATURE, SOAK, hardness('HRB 63 or more')], {})).toMatchObject([
    { verdict: 'not_stated' },
    { verdict: 'not_stated' },
    { verdict: 'not_stated' },
  ]);
});

const fact = (field: string, value: string | number | boolean, confidence = 0.95) => ({
  field,
  value,
  raw: String(value),
  page: 1,
  box: [0, 0, 10, 10] as [number, number, number, number],
  confidence,
});

describe('what a paper must show beside figures', () => {
  const ORDER = { characteristic: 'Order number and revision', limit: '', unit: '' };
  const SIGNED = { characteristic: 'Signature and date', limit: '', unit: '' };
  const parts = [fact('lines[0].part_number', 'MC-1101'), fact('lines[0].rev', 'A')];

  const lines = ['MC-1101', 'MC-1102'].map((part_number) => ({
    part_number,
    rev: 'A',
    qty_accepted: 10,
    qty_rejected: null,
    material: null,
    lot: null,
  }));

  test('a part number alone names no order', () => {
    expect(proposed([ORDER], { purchase_order: null, lines, facts: parts })).toMatchObject([
      { verdict: 'not_stated' },
    ]);
    expect(proposed([ORDER], { lines, facts: [fact('purchase_order', 'TP-1'), ...parts] })).toMatchObject([
      { verdict: 'meets', stated: 'TP-1, MC-1101, A' },
    ]);
  });

  test('a signature without a date, and one that was read poorly, is for a person', () => {
    const signature = fact('signature_present', true);
    expect(proposed([SIGNED], { facts: [signature] })).toMatchObject([{ verdict: 'not_stated' }]);
    const date = (confidence: number) => fact('certificate_date', '2026-06-17', confidence);
    expect(proposed([SIGNED], { facts: [signature, date(0.9)] })).toMatchObject([{ verdict: 'meets' }]);
    expect(proposed([SIGNED], { facts: [signature, date(0.5)] })).toMatchObject([{ verdict: 'cannot_tell' }]);
  });
});
