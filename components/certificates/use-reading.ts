'use client';
import { useCallback, useState } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import type { ProvedRequirement } from '@/lib/certificates/contract';
import type { Verdict } from '@/lib/certificates/verdict';
import { getCertificateReading, type CertificateReading } from '@/lib/readings/contract';
import { qualityOf, type ReadQuality } from '@/lib/readings/quality';

export type Proposal = CertificateReading['proposals'][number];

/** A spot on a page that a row of the list rests on. */
export interface Spot {
  fact: number;
  page: number;
  /** Left, top, right, bottom in points of the upright page. */
  box: readonly [number, number, number, number];
  row: string;
  verdict: Verdict | 'to_decide';
}

const LOOK_AGAIN_MS = 1500;

/** What the machine read on the certificate; looks again until it is done. */
export function useReading(certificateId: string) {
  const { data } = useLazyRead(
    getCertificateReading,
    { certificateId },
    { refreshEveryMs: LOOK_AGAIN_MS, refreshWhile: ({ state }) => state === 'waiting' },
  );
  /** Words chosen on the page for the row that is open. */
  const [chosen, setChosen] = useState('');
  /** Counts the pages drawn, for what points at the one on the screen. */
  const [drawn, setDrawn] = useState(0);
  const onDrawn = useCallback(() => setDrawn((count) => count + 1), []);
  const proposalOf = (requirementId: string) =>
    data?.proposals.find((one) => one.requirementId === requirementId);
  const piecesOf = (lineNo: number) => data?.lines.find((line) => line.lineNo === lineNo);
  return { data, proposalOf, piecesOf, chosen, choose: setChosen, drawn, onDrawn };
}

export const qualityOfProposal = ({ confidence }: Pick<Proposal, 'confidence'>): ReadQuality | null =>
  confidence === null ? null : qualityOf(confidence);

/** One spot for each fact that a row rests on; where several rows rest on one, the selected or the first names it. */
export function spotsOf(
  data: CertificateReading | undefined,
  given: {
    requirements: readonly ProvedRequirement[];
    lines: readonly { id: string; lineNo: number }[];
    selected: string | null;
  },
): Spot[] {
  if (!data) return [];
  const rows = [
    ...given.requirements.map(({ id, decision }) => {
      const proposal = data.proposals.find((one) => one.requirementId === id);
      return {
        row: id,
        facts: proposal?.facts ?? [],
        verdict: decision?.verdict ?? proposal?.verdict ?? ('to_decide' as const),
      };
    }),
    ...given.lines.map(({ id, lineNo }) => ({
      row: id,
      facts: data.lines.find((line) => line.lineNo === lineNo)?.facts ?? [],
      verdict: 'meets' as const,
    })),
  ];
  const bySelected = rows.toSorted(
    (a, b) => Number(b.row === given.selected) - Number(a.row === given.selected),
  );
  const spots = new Map<number, Spot>();
  for (const { row, facts, verdict } of bySelected)
    for (const fact of facts) {
      const stands = data.facts[fact];
      if (stands && !spots.has(fact))
        spots.set(fact, { fact, page: stands.page, box: stands.box, row, verdict });
    }
  return [...spots.values()];
}
