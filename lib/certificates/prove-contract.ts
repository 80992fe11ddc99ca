import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Id, Pieces } from '@/lib/api/shapes';

import { VERDICTS } from './verdict';

const words = (name: string, most: number) =>
  z.string().trim().max(most, `${name}: write ${most} characters or less.`);
/** As short as an override's reason may be: the processor and the auditor read it. */
const SHORTEST_REASON = 20;

export const RecordCertificate = z.object({
  certificateId: Id,
  version: z.int(),
  number: words('Number', 60).min(1, "Enter the certificate's number as printed."),
  datedOn: Day,
});

export const recordCertificate = declare({
  id: 'recordCertificate',
  method: 'patch',
  path: '/certificates/{certificateId}',
  summary: "Record a certificate's number and date as printed",
  side: 'shop',
  permission: 'certificate.prove',
  input: RecordCertificate,
  response: z.object({ version: z.int() }),
});

export const DecideRequirement = z.object({
  certificateId: Id,
  requirementId: Id,
  /** Null for the first decision. */
  version: z.int().nullable(),
  stated: words('What it states', 300).default(''),
  verdict: z.enum(VERDICTS),
  overrideReason: words('Reason', 500)
    .min(SHORTEST_REASON, `Write ${SHORTEST_REASON} letters or more: the processor and the auditor read it.`)
    .nullable()
    .default(null),
  note: words('Note', 500).default(''),
});

export const decideRequirement = declare({
  id: 'decideRequirement',
  method: 'put',
  path: '/certificates/{certificateId}/decisions/{requirementId}',
  summary: 'Decide what a certificate says of one requirement',
  side: 'shop',
  permission: 'certificate.prove',
  input: DecideRequirement,
  response: z.object({ version: z.int() }),
});

export const DecideRequirements = DecideRequirement.omit({ requirementId: true, version: true }).extend({
  requirements: z
    .array(
      DecideRequirement.pick({ requirementId: true, version: true }).extend({
        /** What it states of this one, where that differs. */
        stated: words('What it states', 300).optional(),
      }),
    )
    .min(1, 'Choose at least one requirement.')
    .max(500),
});

export const decideRequirements = declare({
  id: 'decideRequirements',
  method: 'post',
  path: '/certificates/{certificateId}/decisions',
  summary: 'Decide the same of several requirements at once: all of them, or none',
  side: 'shop',
  permission: 'certificate.prove',
  input: DecideRequirements,
  response: z.object({ decided: z.int() }),
});

export const setAsideCertificate = declare({
  id: 'setAsideCertificate',
  method: 'post',
  path: '/certificates/{certificateId}/set-aside',
  summary: 'Set a certificate aside: a second copy, or replaced by a corrected one',
  side: 'shop',
  permission: 'certificate.prove',
  input: z.object({
    certificateId: Id,
    version: z.int(),
    reason: words('Reason', 300).min(1, 'Say why it is set aside.'),
  }),
  response: z.object({ version: z.int() }),
});

export const takeUpCertificate = declare({
  id: 'takeUpCertificate',
  method: 'post',
  path: '/certificates/{certificateId}/take-up',
  summary: 'Take a certificate up again that was set aside',
  side: 'shop',
  permission: 'certificate.prove',
  input: z.object({ certificateId: Id, version: z.int() }),
  response: z.object({ version: z.int() }),
});

export const SignCertificate = z.object({
  certificateId: Id,
  version: z.int(),
  coverage: z
    .array(z.object({ lineId: Id, pieces: Pieces }))
    .min(1, 'No pieces are covered yet. Enter how many on each line.')
    .max(500),
  /** The decisions as the signer saw them, so that nobody signs what changed under their eyes. */
  decisions: z.array(z.object({ requirementId: Id, version: z.int() })).max(1000),
  password: z.string().min(1, 'Enter your password.').max(200),
  /** How long the paper lay open before the signer, where the screen can tell. */
  reviewSeconds: z
    .int()
    .min(0)
    .max(7 * 24 * 3600)
    .nullable()
    .default(null),
});

export const signCertificate = declare({
  id: 'signCertificate',
  method: 'post',
  path: '/certificates/{certificateId}/signatures',
  summary: 'Sign that a certificate covers these pieces; asks for the password again',
  side: 'shop',
  permission: 'certificate.prove',
  input: SignCertificate,
  response: z.object({ signatureId: Id, seal: z.string(), pieces: z.int() }),
});
