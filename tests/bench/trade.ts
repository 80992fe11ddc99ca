import { checkBatch } from '@/lib/batches/checks';
import type { CheckedEquipment, CheckedLine, CheckFacts } from '@/lib/batches/check';
import { loadsOfBatch } from '@/lib/batches/loads-of-batch';
import { BATCH_TABLES } from '@/lib/reference/batch-tables';
import type { ProductForm } from '@/lib/trade/process';

import { factsOf, lineOf } from '../unit/batches/facts-of-batch';

const LINES = 500;
const GROUPS = 12;
const RUNS = 60;
const WARM_UP = 20;

const SOLUTION = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  classType: 'natural age',
  conditionBefore: 'O',
} as const;
const METALS = [
  ['2024', 'T42'],
  ['7075', 'T62'],
  ['6061', 'T62'],
] as const;
const FORMS: readonly ProductForm[] = ['sheet', 'bar'];

/** Line `no` of a part of its own; parts differ in metal, form, cladding and thickness by `kind`. */
function line(no: number, kind: number): CheckedLine {
  const [alloy, condition] = METALS[kind % METALS.length] ?? ['2024', 'T42'];
  const form = FORMS[Math.floor(kind / 3) % 2] ?? 'sheet';
  const thicknessMm = [0.8, 1.6, 3.2, 6.3, 12.7, 25.4][kind % 6] ?? 1.6;
  const part = {
    ...{ alloy, form, clad: form === 'sheet' && kind % 4 === 0 },
    ...{ madeCondition: 'O', endCondition: condition, thicknessMm, thickness: `${thicknessMm} mm` },
    ...{ lengthMm: 300 + (kind % 7) * 100, widthMm: 120, heightMm: 25 },
  };
  return lineOf(no, part, [{ ...SOLUTION, targetCondition: condition, ordering: {} }], { loadNo: null });
}

const ROOM: CheckedEquipment = {
  ...{ id: 'f-3', kind: 'furnace', name: 'F-3', sizeWords: '1200 mm × 900 mm × 900 mm' },
  ...{ lengthMm: 1200, widthMm: 900, heightMm: 900, limitG: 300_000, limitWords: '300 kg' },
  ...{ temperatureCMin: 100, temperatureCMax: 600, temperatureWords: '100 °C to 600 °C', furnaceClass: 2 },
};

/** Middle and slowest of some runs, in milliseconds of processor time whatever else the machine does, after a warm-up that is thrown away. */
function timed(name: string, limitMs: number, run: () => unknown): boolean {
  const times: number[] = [];
  for (let at = 0; at < WARM_UP + RUNS; at++) {
    const began = process.cpuUsage();
    run();
    const { user, system } = process.cpuUsage(began);
    if (at >= WARM_UP) times.push((user + system) / 1000);
  }
  times.sort((one, other) => one - other);
  const middle = times[Math.floor(times.length / 2)] ?? 0;
  const slowest = times[Math.floor(times.length * 0.95)] ?? 0;
  const within = middle < limitMs;
  console.log(
    `${name}: ${middle.toFixed(1)} ms (95 %: ${slowest.toFixed(1)} ms), limit ${limitMs} ms${within ? '' : ' EXCEEDED'}`,
  );
  return within;
}

const sameParts = Array.from({ length: LINES }, (_, at) => line(at + 1, at % 40));
const shared = sameParts.map((one, at) => {
  const like = sameParts[at % 40] ?? one;
  return { ...one, part: like.part, step: like.step, stepId: like.stepId };
});
const batch = (lines: readonly CheckedLine[]) => factsOf(lines, { processor: { equipment: [ROOM] } });
const [ofForty, ofAll] = [batch(shared), batch(sameParts)];
/** What is remembered of the same lines must not flatter the figures. */
const anew = (facts: CheckFacts): CheckFacts => ({ ...facts, lines: [...facts.lines] });
const groups = Array.from({ length: GROUPS }, (_, at) => line(at + 1, at));

const results = [
  timed(`All checks, ${LINES} lines of 40 parts`, 20, () => checkBatch(anew(ofForty))),
  timed(`All checks, ${LINES} lines of ${LINES} parts`, 20, () => checkBatch(anew(ofAll))),
  timed(`Load plan, ${GROUPS} groups`, 50, () => loadsOfBatch(BATCH_TABLES, [...groups])),
];
process.exitCode = results.every(Boolean) ? 0 : 1;
