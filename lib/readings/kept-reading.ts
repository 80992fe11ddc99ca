import { z } from 'zod';

import { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { StatedInvoice } from '@/lib/evidence/invoice/invoice';

/** Bumped when the reader learns something, so that it can be told what an older edition read. */
export const READER_EDITION = 1;

/** A page as it is kept: each word with its box in points, for choosing it on the picture of the page. */
export const KeptPage = z.object({
  number: z.int(),
  width: z.number(),
  height: z.number(),
  turned: z.int(),
  words: z.array(z.tuple([z.string(), z.number(), z.number(), z.number(), z.number()])),
});
export type KeptPage = z.output<typeof KeptPage>;

export const ReadFile = z.object({
  sha256: z.string(),
  pages: z.int(),
  kind: z.enum(['digital', 'scan', 'photo']),
  recognised: z.boolean(),
  /** Words that a person looking at the page cannot see. They decide nothing. */
  hidden: z.array(z.string()),
});
export type ReadFile = z.output<typeof ReadFile>;

/** What was read in a certificate's file: all certificates that it holds, before anything is compared. */
export const KeptCertificates = z.object({ file: ReadFile, certificates: z.array(StatedCertificate) });
export type KeptCertificates = z.output<typeof KeptCertificates>;

export const KeptInvoice = z.object({ file: ReadFile, invoice: StatedInvoice });
export type KeptInvoice = z.output<typeof KeptInvoice>;
