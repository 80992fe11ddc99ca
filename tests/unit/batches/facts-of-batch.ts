import type { CheckedLine, CheckedPart, CheckedStep, CheckFacts } from '@/lib/batches/check';
import type { Approval } from '@/lib/batches/approval';
import { BATCH_TABLES } from '@/lib/reference/batch-tables';

export const STEP: CheckedStep = {
  id: 'step-1',
  process: 'anodize',
  specification: 'MIL-PRF-8625',
  specificationRevision: 'F',
  classType: 'type II class 1',
  conditionBefore: null,
  targetCondition: null,
  ordering: {
    areas: 'all over',
    sampling_plan: 'by the specification',
    coating_thickness: 'by the class',
    abrasion_test: 'none',
    build_up: 'before coating',
    contact_marks: 'in holes',
  },
};

const PART: CheckedPart = {
  id: 'part-1',
  alloy: '6061',
  form: 'sheet',
  clad: false,
  thicknessMm: 1.6,
  lengthMm: null,
  widthMm: null,
  heightMm: null,
  massG: null,
  areaMm2: null,
  sizeWords: null,
  thickness: '0.063 in',
  madeCondition: 'T6',
  endCondition: 'T6',
  route: [STEP],
};

export const APPROVAL: Approval = {
  reference: 'AP-7',
  processes: [],
  specifications: [],
  validFrom: '2026-01-01',
  validTo: '2026-12-31',
  withdrawnAt: null,
};

export const LINE: CheckedLine = {
  id: 'line-1',
  lineNo: 1,
  lotNumber: 'L-0001',
  partNumber: 'P-1',
  partRevision: 'A',
  partName: 'Rib clip',
  partSuperseded: false,
  part: PART,
  stepId: STEP.id,
  step: STEP,
  pieces: 10,
  loadNo: null,
  solutionTreated: [],
  unitPriceMinor: 500,
  requirements: 2,
  characteristics: ['Thickness'],
};

type StepChange = Partial<Omit<CheckedStep, 'id'>>;
export type PartChange = Partial<Omit<CheckedPart, 'id' | 'route'>>;

/** Line `no` of a part of its own, at the last step of its route. */
export function lineOf(
  no: number,
  part: PartChange,
  steps: readonly StepChange[],
  more: Partial<CheckedLine> = {},
): CheckedLine {
  const route = steps.map((change, at): CheckedStep => ({ ...STEP, ...change, id: `step-${no}-${at}` }));
  const step = route.at(-1) ?? STEP;
  return {
    ...LINE,
    id: `line-${no}`,
    lineNo: no,
    lotNumber: `L-000${no}`,
    part: { ...PART, ...part, id: `part-${no}`, route },
    stepId: step.id,
    step,
    ...more,
  };
}

/** A batch of the step that its first line asks for, approved, with nothing else against it. */
export const factsOf = (
  lines: readonly CheckedLine[] = [LINE],
  given: { batch?: Partial<CheckFacts['batch']>; processor?: Partial<CheckFacts['processor']> } = {},
): CheckFacts => {
  const {
    id: _,
    conditionBefore: __,
    targetCondition: ___,
    ordering: ____,
    ...asked
  } = lines[0]?.step ?? STEP;
  return {
    zone: 'UTC',
    now: new Date('2026-06-17T12:00:00Z'),
    today: '2026-06-17',
    batch: {
      ...asked,
      number: 'B-0001',
      wantedBackOn: '2026-07-01',
      leavesOn: null,
      putAsideAt: null,
      lotMinimumMinor: 0,
      certificationFeeMinor: 0,
      requirements: 0,
      characteristics: [],
      ...given.batch,
    },
    processor: {
      id: 'processor-1',
      name: 'Ostrow',
      active: true,
      approvals: [{ ...APPROVAL, processes: [asked.process] }],
      equipment: [],
      ...given.processor,
    },
    lines,
    tables: BATCH_TABLES,
  };
};
