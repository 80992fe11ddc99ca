import type { FieldError } from '@/lib/errors';

import { ruleOf } from './allowed-dispositions';
import { DISPOSITION_WORDS, type Disposition } from './disposition';
import { KIND_WORDS, type NonconformanceKind } from './kind';

interface Asked {
  disposition: Disposition;
  pieces: number;
  authority: string;
  fileId: string | null;
  pieceIds: readonly string[];
}

interface DecidedAbout {
  kind: NonconformanceKind;
  /** Pieces not yet decided about. */
  left: number;
  /** Pieces still away, which a short count can be written off from. */
  away: number;
  serialised: boolean;
}

/** What a disposition still lacks, field by field. */
export function faultsOfDisposition(asked: Asked, about: DecidedAbout): FieldError[] {
  const rule = ruleOf(about.kind, asked.disposition);
  const words = DISPOSITION_WORDS[asked.disposition];
  if (!rule)
    return [
      { field: 'disposition', message: `What is ${KIND_WORDS[about.kind]} cannot be decided as ${words}.` },
    ];
  const faults: FieldError[] = [];
  if (asked.pieces > about.left)
    faults.push({ field: 'pieces', message: `${about.left} left to decide. Enter ${about.left} or less.` });
  else if (rule.to === 'lost' && asked.pieces > about.away)
    faults.push({
      field: 'pieces',
      message: `${about.away} of the line still away; the rest came back since. Write off ${about.away} or less.`,
    });
  if (rule.authority && asked.authority === '')
    faults.push({ field: 'authority', message: 'Name who allows it, and by which paper.' });
  if (rule.file && asked.fileId === null)
    faults.push({ field: 'fileId', message: 'Add the paper that grants the concession.' });
  if (about.serialised && rule.to !== null && asked.pieceIds.length !== asked.pieces)
    faults.push({
      field: 'pieceIds',
      message: `${asked.pieceIds.length} serial numbers ticked for ${asked.pieces} pieces. Tick one for each.`,
    });
  return faults;
}
