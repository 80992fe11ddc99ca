import type { z } from 'zod';

import type { Part, PartInput } from '@/lib/parts/contract';

/** What the form holds: everything as it was typed. */
export type PartValues = z.input<typeof PartInput>;
export type StepValues = NonNullable<PartValues['route']>[number];

export const EMPTY_STEP = {
  process: '',
  specification: '',
  specificationRevision: '',
  classType: '',
  conditionBefore: '',
  targetCondition: '',
  toProve: [],
  ordering: {},
  note: '',
} as unknown as StepValues;
export const EMPTY_PROOF = {
  characteristic: '',
  limit: '',
  unit: '',
  source: 'specification' as const,
  sourceText: '',
};

export const EMPTY_PART = {
  number: '',
  revision: '',
  name: '',
  alloy: '',
  form: '',
  clad: false,
  thickness: '',
  madeCondition: '',
  endCondition: '',
  length: '',
  width: '',
  height: '',
  mass: '',
  area: '',
  serialised: false,
  note: '',
  drawingFileId: null,
  route: [EMPTY_STEP],
} as unknown as PartValues;

/** A part that is there, as its form begins with it. */
export function valuesOf(part: Part): PartValues {
  const typed = (measure: { entered: string } | null) => measure?.entered ?? '';
  return {
    number: part.number,
    revision: part.revision,
    name: part.name,
    alloy: part.alloy,
    form: part.form,
    clad: part.clad,
    thickness: typed(part.thickness),
    madeCondition: part.madeCondition,
    endCondition: part.endCondition,
    length: typed(part.length),
    width: typed(part.width),
    height: typed(part.height),
    mass: typed(part.mass),
    area: typed(part.area),
    serialised: part.serialised,
    note: part.note ?? '',
    drawingFileId: part.drawing?.id ?? null,
    route: part.route.map((step) => ({
      id: step.id,
      process: step.process,
      specification: step.specification,
      specificationRevision: step.specificationRevision ?? '',
      classType: step.classType ?? '',
      conditionBefore: step.conditionBefore ?? '',
      targetCondition: step.targetCondition ?? '',
      toProve: step.toProve,
      ordering: step.ordering,
      note: step.note ?? '',
    })),
  };
}

/** The next revision begins as the one before; its drawing is another, so that field is empty. */
export const valuesForRevision = (part: Part): PartValues => ({
  ...valuesOf(part),
  revision: nextRevision(part.revision),
  drawingFileId: null,
  route: (valuesOf(part).route ?? []).map((step) => ({ ...step, id: undefined })),
});

/** `C` to `D`, `03` to `04`; what has no plain successor is left for the person to say. I, O, Q, S, X, Z are not used on drawings. */
export function nextRevision(revision: string): string {
  if (/^\d+$/.test(revision)) return String(Number(revision) + 1).padStart(revision.length, '0');
  const letters = 'ABCDEFGHJKLMNPRTUVWY';
  const at = revision.length === 1 ? letters.indexOf(revision) : -1;
  return at === -1 ? '' : (letters[at + 1] ?? '');
}
