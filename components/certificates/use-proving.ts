'use client';
import { useState } from 'react';

import { useRead, useWrite } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { showMessage } from '@/components/ui/message';
import { getCertificate, listCertificates, type ProvedRequirement } from '@/lib/certificates/contract';
import { decideRequirement, decideRequirements } from '@/lib/certificates/prove-contract';
import { readinessOf } from '@/lib/certificates/ready-to-sign';
import type { Verdict } from '@/lib/certificates/verdict';

import { rowsOf } from './certificate-words';
import { usePiecesEntered } from './use-pieces-entered';
import { useReading } from './use-reading';

interface Judgement {
  stated?: string;
  verdict: Verdict;
  overrideReason?: string | null;
  note?: string;
}

/** Where the inspector stands in one certificate: the row that is open, the pieces entered, what is still to decide. */
export function useProving(certificateId: string) {
  const { data } = useRead(getCertificate, { certificateId });
  const mayProve = useMay('certificate.prove');
  const [selected, setSelected] = useState<string | null>(null);
  const entering = usePiecesEntered(certificateId, data.lines);
  const reading = useReading(certificateId);
  const [openedAt] = useState(() => performance.now());
  const { pieces } = entering;
  const writeAll = useWrite(decideRequirements, { refreshes: [getCertificate, listCertificates] });
  const write = useWrite(decideRequirement, { refreshes: [getCertificate, listCertificates] });

  const coverage = data.lines.map((line) => ({ lineId: line.id, pieces: pieces[line.id] ?? 0 }));
  const readiness = readinessOf(
    data.requirements.map((one) => ({ ...one, requirementId: one.id })),
    coverage,
  );
  const isDecided = (rowId: string) =>
    data.requirements.some((one) => one.id === rowId && one.decision !== null) ||
    pieces[rowId] != null ||
    data.lines.some((line) => line.id === rowId && line.coverable === 0);
  const rows = rowsOf(data);

  const toRow = (rowId: string | undefined) => {
    if (rowId === undefined) return;
    setSelected(rowId);
    reading.choose('');
    focusRow(rowId);
  };
  /** On to the next row that is still to decide; where none is left, to the next row. */
  const onward = (from: string, decidedWithIt: readonly string[] = []) => {
    const after = rows.slice(rows.indexOf(from) + 1);
    toRow(after.find((rowId) => !isDecided(rowId) && !decidedWithIt.includes(rowId)) ?? after[0]);
  };

  const decide = async (
    requirement: ProvedRequirement,
    { stated, verdict, overrideReason = null, note }: Judgement,
  ) => {
    const { decision } = requirement;
    const input = {
      certificateId,
      requirementId: requirement.id,
      version: decision?.version ?? null,
      stated: stated ?? decision?.stated ?? '',
      verdict,
      overrideReason,
      note: note ?? decision?.note ?? '',
    };
    await write.mutateAsync(input).catch(tellFailure);
  };

  /** The same for several at once: one statement on the page that speaks for them all. */
  const decideAll = async (
    requirements: readonly ProvedRequirement[],
    { stated, verdict }: { stated: string; verdict: Verdict },
    statedOf?: (requirement: ProvedRequirement) => string,
  ) => {
    const versions = requirements.map((requirement) => ({
      requirementId: requirement.id,
      version: requirement.decision?.version ?? null,
      ...(statedOf && { stated: statedOf(requirement) }),
    }));
    await writeAll.mutateAsync({ certificateId, requirements: versions, stated, verdict }).catch(tellFailure);
  };

  return {
    data,
    canEdit: mayProve && data.certificate.setAsideAt === null && data.file.verified,
    mayProve,
    selected,
    select: (rowId: string) => {
      if (rowId !== selected) reading.choose('');
      setSelected(rowId);
    },
    toRow,
    onward,
    decide,
    decideAll,
    ...entering,
    reading,
    /** Since the paper was opened, for the record of the review. */
    secondsOpen: () => Math.round((performance.now() - openedAt) / 1000),
    coverage: coverage.filter((line) => line.pieces > 0),
    readiness,
    rows,
    decided: rows.filter(isDecided).length,
  };
}
export type Proving = ReturnType<typeof useProving>;

const tellFailure = (error: unknown) =>
  showMessage({ says: error instanceof Error ? error.message : 'Not saved.', failed: true });

/** The row that opens is drawn with the next frame; the focus waits for it. */
function focusRow(rowId: string) {
  requestAnimationFrame(() =>
    document.getElementById(`row-${rowId}`)?.focus({ focusVisible: true } as FocusOptions),
  );
}
