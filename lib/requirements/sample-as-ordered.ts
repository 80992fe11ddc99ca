import type { BatchTables } from '@/lib/reference/batch-tables';
import { INSPECTION_LEVELS, type InspectionLevel } from '@/lib/trade/sampling/code-letter';
import { sampleForLot } from '@/lib/trade/sampling/sample-for-lot';
import { zeroAcceptanceInstead } from '@/lib/trade/sampling/zero-acceptance-sample';
import type { Source } from '@/lib/trade/source';

export interface SamplingOrdered {
  readonly aqlPct: number;
  readonly level: InspectionLevel;
  readonly severity: 'normal' | 'tightened' | 'reduced';
  readonly isZeroAcceptance: boolean;
}

/**
 * A sampling plan as an order states it: `AQL 1.0, level II`, `tightened, AQL 0.65`, `AQL 2.5, c = 0`. Level II and
 * normal inspection hold where nothing else is said. Null where no quality level is named: none is guessed.
 */
export function readSampling(stated: string): SamplingOrdered | null {
  const [, aql] = /\bAQL\s*(?:of\s*|=\s*)?(\d+(?:\.\d+)?|\.\d+)/i.exec(stated) ?? [];
  if (aql === undefined) return null;
  const [, named = 'II'] = /\blevel\s*(S-?[1-4]|I{1,3})\b/i.exec(stated) ?? [];
  const level = INSPECTION_LEVELS.find((one) => one === named.toUpperCase().replace('-', ''));
  const [severity = 'normal'] = SEVERITIES.filter((one) => stated.toLowerCase().includes(one));
  return {
    aqlPct: Number(aql),
    level: level ?? 'II',
    severity,
    isZeroAcceptance: /\bc\s*=\s*0\b|zero.?accept/i.test(stated),
  };
}

const SEVERITIES = ['tightened', 'reduced'] as const;

export interface OrderedSample extends SamplingOrdered {
  /** Pieces to look at. */
  readonly inspect: number;
  readonly accept: number;
  readonly reject: number;
  readonly source: Source;
}

/** How many of so many pieces are looked at by the plan that the order states; null where it states none. */
export function sampleAsOrdered(
  { requirements }: Pick<BatchTables, 'requirements'>,
  stated: string | undefined,
  pieces: number,
): OrderedSample | null {
  const ordered = readSampling(stated ?? '');
  if (!ordered) return null;
  const plan = sampleForLot(
    { letters: requirements.codeLetters, plans: requirements.sampling[ordered.severity] },
    { lotSize: pieces, level: ordered.level, aqlPct: ordered.aqlPct },
  );
  if (!plan.ok) return null;
  const { inspect, accept, reject, source } = plan;
  if (!ordered.isZeroAcceptance) return { ...ordered, inspect, accept, reject, source };
  const zero = zeroAcceptanceInstead(plan, pieces);
  return zero.ok ? { ...ordered, inspect: zero.sampleSize, accept: 0, reject: 1, source: zero.source } : null;
}
