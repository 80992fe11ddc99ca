import type { ChartCorrections } from '@/lib/evidence/chart/corrections';
import type { JudgedChart } from '@/lib/evidence/chart/judged-chart';
import type { ChartRequirement } from '@/lib/evidence/chart/requirement';

/** All that a dossier says of one lot. Plain values, so that the page, the document and the archive say the same. */
export interface DossierContent {
  shop: { name: string; address: string[]; zone: string };
  lot: {
    id: string;
    number: string;
    heat: string;
    madeOn: string;
    serialised: boolean;
    made: number;
    serials: string[];
  };
  part: {
    number: string;
    revision: string;
    name: string;
    material: string;
    thickness: string | null;
    madeCondition: string;
    endCondition: string;
  };
  route: { seq: number; process: string; specification: string; targetCondition: string | null }[];
  whereabouts: { place: string; holder: string; pieces: number }[];
  batches: DossierBatch[];
  movements: { at: string; by: string; pieces: number; from: string; to: string; reason: string }[];
  /** Every original, with the hash it was kept under. */
  files: DossierFile[];
  auditHead: { seq: number; hash: string } | null;
}

export interface DossierBatch {
  id: string;
  number: string;
  orderNumber: string;
  processor: string;
  processorAddress: string[];
  approval: string | null;
  process: string;
  specification: string;
  classType: string | null;
  lineNo: number;
  pieces: number;
  conditionBefore: string | null;
  targetCondition: string | null;
  dispatchedAt: string | null;
  dispatchedBy: string | null;
  overrides: { check: string; reason: string; by: string }[];
  receipts: { at: string; by: string; good: number; damaged: number; short: number; over: number }[];
  requirements: {
    characteristic: string;
    limit: string;
    decisions: {
      certificate: string;
      stated: string;
      verdict: string;
      overrideReason: string | null;
      by: string;
    }[];
  }[];
  /** What a person put in place of what the machine read on a certificate, the earliest first; the later of a field counts. */
  corrections: {
    certificate: string;
    field: string;
    read: string | null;
    corrected: string;
    by: string;
    at: string;
  }[];
  /** Those that were read: against what, as understood by whom, and what came of it. */
  charts: DossierChart[];
  signatures: {
    certificate: string;
    pieces: number;
    signer: string;
    at: string;
    sentence: string;
    seal: string;
    fileSha256: string;
  }[];
  nonconformances: {
    number: string;
    kind: string;
    what: string;
    pieces: number;
    dispositions: {
      disposition: string;
      pieces: number;
      reason: string;
      authority: string | null;
      by: string;
      at: string;
    }[];
  }[];
  releases: { at: string; by: string; pieces: number; to: string }[];
}

export interface DossierChart {
  id: string;
  fileId: string;
  fileName: string;
  requirement: ChartRequirement;
  corrections: ChartCorrections;
  verdict: JudgedChart['verdict'];
  soakMinutes: number | null;
  /** In whole sentences. */
  why: string;
}

export interface DossierFile {
  id: string;
  name: string;
  purpose: string;
  mediaType: string;
  size: number;
  sha256: string;
  storageKey: string;
  batchNumber: string | null;
}
