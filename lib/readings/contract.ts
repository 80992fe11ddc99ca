import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';
import { VERDICTS } from '@/lib/certificates/verdict';
import { Discrepancy } from '@/lib/evidence/certificate/certificate';
import { Fact } from '@/lib/evidence/fact';

import { KeptPage } from './kept-reading';
import { READING_STATES } from './reading-state';

export const Proposal = z.object({
  requirementId: Id,
  stated: z.string(),
  verdict: z.enum(VERDICTS),
  why: z.string(),
  /** Places in `facts`. */
  facts: z.array(z.int()),
  confidence: z.number().nullable(),
});

export const Correction = z.object({
  field: z.string(),
  read: z.string().nullable(),
  corrected: z.string(),
  correctedBy: z.string(),
  correctedAt: Moment,
});

/** What the machine read on a certificate and proposes for its batch. A person decides. */
export const CertificateReading = z.object({
  /** Null where the file was taken in before files were read. */
  state: z.enum(READING_STATES).nullable(),
  fault: z.string().nullable(),
  seconds: z.number().nullable(),
  recognised: z.boolean(),
  certificateNumber: z.string().nullable(),
  certificateDate: z.string().nullable(),
  facts: z.array(Fact),
  /** Of the page with that number; for choosing words on its picture. */
  pages: z.array(KeptPage),
  proposals: z.array(Proposal),
  lines: z.array(z.object({ lineNo: z.int(), pieces: z.int(), facts: z.array(z.int()) })),
  discrepancies: z.array(Discrepancy),
  observations: z.array(z.string()),
  corrections: z.array(Correction),
});
export type CertificateReading = z.output<typeof CertificateReading>;

export const getCertificateReading = declare({
  id: 'getCertificateReading',
  method: 'get',
  path: '/certificates/{certificateId}/reading',
  summary: 'What the machine read on a certificate, and what it proposes',
  side: 'shop',
  permission: 'certificate.read',
  input: z.object({ certificateId: Id }),
  response: CertificateReading,
});

export const readCertificateAgain = declare({
  id: 'readCertificateAgain',
  method: 'post',
  path: '/certificates/{certificateId}/read-again',
  summary: 'Have the machine read a certificate once more',
  side: 'shop',
  permission: 'certificate.add',
  input: z.object({ certificateId: Id }),
  response: z.object({ state: z.enum(READING_STATES) }),
});

export const CorrectReading = z.object({
  certificateId: Id,
  field: z.string().trim().min(1).max(120),
  corrected: z.string().trim().max(400, 'Write 400 characters or less.'),
});

export const correctReading = declare({
  id: 'correctReading',
  method: 'post',
  path: '/certificates/{certificateId}/corrections',
  summary: 'Put another value in place of what the machine read; both are kept',
  side: 'shop',
  permission: 'certificate.prove',
  input: CorrectReading,
  response: z.object({ field: z.string() }),
});
