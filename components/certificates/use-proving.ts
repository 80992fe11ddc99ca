'use client';
import { useState } from 'react';

import { useRead, useWrite } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { showMessage } from '@/components/ui/message';
import {
  decideRequirement,
  getCertificate,
  listCertificates,
  type ProvedRequirement,
} from '@/lib/certificates/contract';
import { readinessOf } from '@/lib/certificates/ready-to-sign';
import type { Verdict } from '@/lib/certificates/verdict';

import { rowsOf } from './certificate-words';

interface Reading {
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
  const [pieces, setPieces] = useState<Record<string, number | null>>({});
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
    focusRow(rowId);
  };
  /** On to the next row that is still to decide; where none is left, to the next row. */
  const onward = (from: string) => {
    const after = rows.slice(rows.indexOf(from) + 1);
    toRow(after.find((rowId) => !isDecided(rowId)) ?? after[0]);
  };

  const decide = async (
    requirement: ProvedRequirement,
    { stated, verdict, overrideReason = null, note }: Reading,
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
    await write
      .mutateAsync(input)
      .catch((error: unknown) =>
        showMessage({ says: error instanceof Error ? error.message : 'Not saved.', failed: true }),
      );
  };

  return {
    data,
    canEdit: mayProve && data.certificate.setAsideAt === null && data.file.verified,
    mayProve,
    selected,
    select: setSelected,
    toRow,
    onward,
    decide,
    pieces,
    setPieces: (lineId: string, count: number | null) => setPieces((now) => ({ ...now, [lineId]: count })),
    forgetPieces: () => setPieces({}),
    coverage: coverage.filter((line) => line.pieces > 0),
    readiness,
    rows,
    decided: rows.filter(isDecided).length,
  };
}
export type Proving = ReturnType<typeof useProving>;

/** The row that opens is drawn with the next frame; the focus waits for it. */
function focusRow(rowId: string) {
  requestAnimationFrame(() =>
    document.getElementById(`row-${rowId}`)?.focus({ focusVisible: true } as FocusOptions),
  );
}
