import { z } from 'zod';

import { Fact } from '../fact';
import { Day } from '../order';

/** Local time, ISO 8601 to the minute. */
export const LocalMinute = z.string().regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d$/);

export const CertificateLine = z.object({
  part_number: z.string().nullable(),
  rev: z.string().nullable(),
  qty_accepted: z.int().nullable(),
  qty_rejected: z.int().nullable(),
  material: z.string().nullable(),
  lot: z.string().nullable(),
  serials: z.array(z.string()).optional(),
});
export type CertificateLine = z.output<typeof CertificateLine>;

/** `step`: solution, natural_age, artificial_age, austenitize, temper, stress_relief, anneal, normalize, embrittlement_relief … */
export const Cycle = z.object({
  step: z.string(),
  set_temp: z.number().nullable(),
  /** As printed. */
  unit: z.enum(['F', 'C']).nullable(),
  soak_start: LocalMinute.nullable(),
  soak_end: LocalMinute.nullable(),
  minutes: z.number().nullable(),
});
export type Cycle = z.output<typeof Cycle>;

/** `kind`: hardness, conductivity, thickness, tensile … ; `unit` as printed. */
export const Reading = z.object({
  kind: z.string(),
  unit: z.string().nullable(),
  values: z.array(z.number()),
});
export type Reading = z.output<typeof Reading>;

/** What a certificate states, before anything is compared with it. A value that cannot be read is null. */
export const StatedCertificate = z.object({
  processor: z.string().nullable(),
  certificate_number: z.string().nullable(),
  certificate_date: Day.nullable(),
  purchase_order: z.string().nullable(),
  batch: z.string().nullable(),
  process: z.string().nullable(),
  specification: z.string().nullable(),
  specification_revision: z.string().nullable(),
  class_type: z.string().nullable(),
  /** The condition after the work, and the alloy, where stated apart from a line's material. */
  alloy: z.string().nullable(),
  condition: z.string().nullable(),
  lines: z.array(CertificateLine),
  cycles: z.array(Cycle),
  quench_medium: z.string().nullable(),
  quench_delay_s: z.number().nullable(),
  plating_end: LocalMinute.nullable(),
  bake_start: LocalMinute.nullable(),
  bake_end: LocalMinute.nullable(),
  readings: z.array(Reading),
  ndt: z
    .object({
      method: z.string().nullable(),
      type: z.string().nullable(),
      sensitivity: z.string().nullable(),
      result: z.string().nullable(),
      personnel_level: z.string().nullable(),
    })
    .nullable(),
  sample_size: z.int().nullable(),
  furnace: z.string().nullable(),
  load: z.string().nullable(),
  signature_present: z.boolean(),
  signed_by: z.string().nullable(),
  signer_title: z.string().nullable(),
  conformance_statement: z.boolean(),
  /** Where each of these stands, and what else was read. */
  facts: z.array(Fact),
});
export type StatedCertificate = z.output<typeof StatedCertificate>;

export const REQUIREMENT_VERDICTS = ['meets', 'fails', 'not_stated', 'cannot_tell'] as const;

export const RequirementVerdict = z.object({
  /** In words, with its limit. */
  requirement: z.string(),
  /** Of the order, null where it is asked of the whole batch. */
  line: z.int().nullable(),
  stated: z.string().nullable(),
  verdict: z.enum(REQUIREMENT_VERDICTS),
  why: z.string(),
});
export type RequirementVerdict = z.output<typeof RequirementVerdict>;

export const Discrepancy = z.object({
  code: z.string(),
  /** Of the order. */
  line: z.int().nullable(),
  ordered: z.string().nullable(),
  stated: z.string().nullable(),
  message: z.string(),
  severity: z.enum(['blocks', 'check']),
});
export type Discrepancy = z.output<typeof Discrepancy>;

/** A certificate received earlier, so that one that is used again is caught. */
export const SeenCertificate = z.looseObject({
  processor: z.string().nullish(),
  certificate_number: z.string().nullish(),
  purchase_order: z.string().nullish(),
  sha256: z.string().nullish(),
});
export type SeenCertificate = z.output<typeof SeenCertificate>;

/** The document that `read:certificate` prints. */
export const ReadCertificate = StatedCertificate.extend({
  file: z.object({
    sha256: z.string(),
    pages: z.int(),
    kind: z.enum(['digital', 'scan', 'photo']),
    recognised: z.boolean(),
  }),
  /** The batch of the open order that it belongs to. */
  matches_batch: z.string().nullable(),
  verdicts: z.array(RequirementVerdict),
  discrepancies: z.array(Discrepancy),
  observations: z.array(z.string()),
});
export type ReadCertificate = z.output<typeof ReadCertificate>;
