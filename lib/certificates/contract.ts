import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { REQUIREMENT_SOURCES } from '@/lib/parts/to-prove';
import { PROCESSES } from '@/lib/trade/process';

import { VERDICTS } from './verdict';

/** `waiting` to be proved, `signed` for, or `set_aside` as a second copy or replaced. */
export const CERTIFICATE_STATES = ['waiting', 'signed', 'set_aside'] as const;
const State = z.enum(CERTIFICATE_STATES);
export type CertificateState = z.output<typeof State>;

export const CertificateRow = z.object({
  id: Id,
  number: z.string().nullable(),
  datedOn: z.string().nullable(),
  state: State,
  fileId: Id,
  fileName: z.string(),
  fileVerified: z.boolean(),
  sentBy: z.string(),
  createdAt: Moment,
  batchId: Id,
  batchNumber: z.string(),
  stage: z.enum(STAGES),
  processor: z.string(),
  process: z.enum(PROCESSES),
  pieces: z.int(),
  coveredPieces: z.int(),
  requirements: z.int(),
  decided: z.int(),
});
export type CertificateRow = z.output<typeof CertificateRow>;

export const listCertificates = declare({
  id: 'listCertificates',
  method: 'get',
  path: '/certificates',
  summary: 'Certificates: waiting to be proved first, then newest first',
  side: 'shop',
  permission: 'certificate.read',
  input: PageQuery.extend({ batchId: Id.optional(), state: State.optional() }),
  response: pageOf(CertificateRow),
});

export const Decision = z.object({
  stated: z.string(),
  verdict: z.enum(VERDICTS),
  overrideReason: z.string().nullable(),
  note: z.string().nullable(),
  decidedBy: z.string(),
  decidedAt: Moment,
  version: z.int(),
  /** Sealed by a signature: it cannot be changed any more. */
  sealed: z.boolean(),
});
export type Decision = z.output<typeof Decision>;

export const ProvedRequirement = z.object({
  id: Id,
  lineId: Id.nullable(),
  lineNo: z.int().nullable(),
  characteristic: z.string(),
  limit: z.string(),
  unit: z.string(),
  source: z.enum(REQUIREMENT_SOURCES),
  sourceText: z.string(),
  decision: Decision.nullable(),
});
export type ProvedRequirement = z.output<typeof ProvedRequirement>;

export const ProvedLine = z.object({
  id: Id,
  lineNo: z.int(),
  lotNumber: z.string(),
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  pieces: z.int(),
  inQuarantine: z.int(),
  onHold: z.int(),
  away: z.int(),
  /** Covered by all signed certificates together, less what a hold took away. */
  covered: z.int(),
  /** Pieces this certificate can still be signed for. */
  coverable: z.int(),
  /** What other certificates of the batch cover of this line. */
  elsewhere: z.array(z.object({ certificateId: Id, number: z.string().nullable(), pieces: z.int() })),
  /** What this one covers by earlier signatures. */
  here: z.int(),
});
export type ProvedLine = z.output<typeof ProvedLine>;

export const CertificateDetail = z.object({
  certificate: z.object({
    id: Id,
    number: z.string().nullable(),
    datedOn: z.string().nullable(),
    sentBy: z.string(),
    createdAt: Moment,
    setAsideAt: Moment.nullable(),
    setAsideReason: z.string().nullable(),
    state: State,
    version: z.int(),
  }),
  file: z.object({
    id: Id,
    name: z.string(),
    mediaType: z.string(),
    size: z.int(),
    sha256: z.string().nullable(),
    verified: z.boolean(),
  }),
  batch: z.object({
    id: Id,
    number: z.string(),
    orderNumber: z.string(),
    stage: z.enum(STAGES),
    processor: z.string(),
    process: z.enum(PROCESSES),
    specification: z.string(),
    specificationRevision: z.string().nullable(),
    classType: z.string().nullable(),
    pieces: z.int(),
  }),
  requirements: z.array(ProvedRequirement),
  lines: z.array(ProvedLine),
  held: z.array(z.object({ id: Id, number: z.string(), lineNo: z.int(), pieces: z.int(), what: z.string() })),
  signatures: z.array(
    z.object({
      id: Id,
      sentence: z.string(),
      signerName: z.string(),
      signedAt: Moment,
      seal: z.string(),
      fileSha256: z.string(),
      /** How long the paper lay open before the signer; null where no screen could tell. */
      reviewSeconds: z.int().nullable(),
      /** What was sealed still has the hash it was sealed with. */
      intact: z.boolean(),
      coverage: z.array(z.object({ lineNo: z.int(), partNumber: z.string(), pieces: z.int() })),
    }),
  ),
  others: z.array(
    z.object({
      id: Id,
      number: z.string().nullable(),
      fileName: z.string(),
      state: State,
      createdAt: Moment,
    }),
  ),
  charts: z.array(z.object({ id: Id, fileId: Id, fileName: z.string(), mediaType: z.string() })),
  /** The same file, byte for byte, sent before. */
  sameFile: z.array(
    z.object({
      certificateId: Id,
      number: z.string().nullable(),
      batchNumber: z.string(),
      sameBatch: z.boolean(),
      signed: z.boolean(),
    }),
  ),
  /** What the shop says where the reader dispatched this batch; null where somebody else did. */
  dispatchedByYou: z.enum(['refuse', 'record']).nullable(),
  /** The sentence the reader would sign. */
  sentence: z.string(),
});
export type CertificateDetail = z.output<typeof CertificateDetail>;

export const getCertificate = declare({
  id: 'getCertificate',
  method: 'get',
  path: '/certificates/{certificateId}',
  summary: 'A certificate beside what its batch must prove',
  side: 'shop',
  permission: 'certificate.read',
  input: z.object({ certificateId: Id }),
  response: CertificateDetail,
});

export const addCertificate = declare({
  id: 'addCertificate',
  method: 'post',
  path: '/certificates',
  summary: 'Add a certificate that came on paper or by mail, as an uploaded file',
  side: 'shop',
  permission: 'certificate.add',
  input: z.object({ batchId: Id, fileId: Id }),
  response: z.object({ id: Id }),
});
