import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';

import { READING_STATES } from './reading-state';

/** A batch that a paper may be of, and what speaks for it. */
export const Candidate = z.object({
  batchId: Id,
  batchNumber: z.string(),
  processor: z.string(),
  /** Speaks for it clearly enough to be proposed. */
  isClear: z.boolean(),
  reasons: z.array(z.string()),
});

export const IntakeRow = z.object({
  id: Id,
  fileId: Id,
  fileName: z.string(),
  addedBy: z.string(),
  createdAt: Moment,
  state: z.enum(READING_STATES),
  fault: z.string().nullable(),
  /** As read: who sent it, its number, the order that it names. */
  processor: z.string().nullable(),
  number: z.string().nullable(),
  order: z.string().nullable(),
  candidates: z.array(Candidate),
});
export type IntakeRow = z.output<typeof IntakeRow>;

export const listIntake = declare({
  id: 'listIntake',
  method: 'get',
  path: '/intake',
  summary: 'Papers that came without saying which batch they are of, with the batches they may be of',
  side: 'shop',
  permission: 'certificate.read',
  input: z.object({}),
  response: z.object({ rows: z.array(IntakeRow) }),
});

export const addToIntake = declare({
  id: 'addToIntake',
  method: 'post',
  path: '/intake',
  summary: 'Take in a certificate whose batch is not known yet',
  side: 'shop',
  permission: 'certificate.add',
  input: z.object({ fileId: Id }),
  response: z.object({ id: Id }),
});

export const readIntakeAgain = declare({
  id: 'readIntakeAgain',
  method: 'post',
  path: '/intake/{intakeId}/read-again',
  summary: 'Have the machine read a paper without a batch once more',
  side: 'shop',
  permission: 'certificate.add',
  input: z.object({ intakeId: Id }),
  response: z.object({ state: z.enum(READING_STATES) }),
});

export const assignIntake = declare({
  id: 'assignIntake',
  method: 'post',
  path: '/intake/{intakeId}/assign',
  summary: 'Say which batch a paper is of: it becomes a certificate of that batch',
  side: 'shop',
  permission: 'certificate.add',
  input: z.object({ intakeId: Id, batchId: Id }),
  response: z.object({ certificateId: Id }),
});

export const SetAsideIntake = z.object({
  intakeId: Id,
  reason: z
    .string()
    .trim()
    .min(10, 'Write 10 letters or more: somebody will ask where the paper went.')
    .max(500, 'Write 500 characters or less.'),
});

export const setAsideIntake = declare({
  id: 'setAsideIntake',
  method: 'post',
  path: '/intake/{intakeId}/set-aside',
  summary: 'Set a paper aside that is of no batch, with the reason',
  side: 'shop',
  permission: 'certificate.add',
  input: SetAsideIntake,
  response: z.object({ id: Id }),
});
