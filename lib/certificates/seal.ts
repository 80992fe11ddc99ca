import { createHash } from 'node:crypto';

import { canonicalJson } from './canonical-json';
import type { Verdict } from './verdict';

/** All that a signature stands for. Its canonical text is kept as signed; the hash of that text is the seal. */
export interface Sealed {
  form: 'lotwright certificate signature 1';
  certificate: { id: string; number: string; datedOn: string; fileId: string; fileSha256: string };
  batch: { id: string; number: string; orderNumber: string };
  decisions: {
    requirementId: string;
    lineNo: number | null;
    characteristic: string;
    limit: string;
    unit: string;
    stated: string;
    verdict: Verdict;
    overrideReason: string | null;
    note: string | null;
    decidedBy: string;
    decidedAt: string;
  }[];
  coverage: {
    lineId: string;
    lineNo: number;
    partNumber: string;
    partRevision: string;
    lotNumber: string;
    pieces: number;
  }[];
  held: { number: string; lineNo: number; pieces: number }[];
  sentence: string;
  dispatchedBySigner: boolean;
  signer: { id: string; name: string };
  signedAt: string;
}

export function sealUp(content: Sealed): { sealed: string; seal: string } {
  const sealed = canonicalJson(content);
  return { sealed, seal: sealOf(sealed) };
}

export const sealOf = (sealed: string): string => createHash('sha256').update(sealed).digest('hex');
