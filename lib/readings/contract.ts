import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';
import { VERDICTS } from '@/lib/certificates/verdict';
import { Discrepancy } from '@/lib/evidence/certificate/certificate';
import { Fact } from '@/lib/evidence/fact';

import { Candidate } from './intake-contract';
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

/** One of the certificates that a file holds, where it holds several or is for several batches. */
export const InFile = z.object({
  /** From 0, in the order of the pages. */
  place: z.int(),
  number: z.string().nullable(),
  order: z.string().nullable(),
  parts: z.array(z.string()),
  /** The one that is looked at. */
  isThis: z.boolean(),
  /** The certificates that it was taken up as. */
  taken: z.array(z.object({ certificateId: Id, batchId: Id, batchNumber: z.string() })),
  /** Batches that it speaks of and was not taken up for. */
  fits: z.array(Candidate.omit({ processor: true })),
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
  inFile: z.array(InFile),
  proposals: z.array(Proposal),
  lines: z.array(
    z.object({
      lineNo: z.int(),
      pieces: z.int(),
      facts: z.array(z.int()),
      /** Whether all pieces of the line are accounted for, and on which papers. */
      why: z.string(),
    }),
  ),
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

export const AddFromFile = z.object({
  certificateId: Id,
  /** Which of the certificates in its file, as its reading counts them. */
  place: z.int().min(0),
  batchId: Id,
});

export const addFromFile = declare({
  id: 'addFromFile',
  method: 'post',
  path: '/certificates/{certificateId}/of-file',
  summary: 'Take up another certificate of the same file, or the same one for another batch',
  side: 'shop',
  permission: 'certificate.add',
  input: AddFromFile,
  response: z.object({ certificateId: Id }),
});
