'use client';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';

import type { ChartCorrections } from '@/lib/evidence/chart/corrections';
import { drawingOf, type ChartDrawing } from '@/lib/evidence/chart/drawing-of';
import { judgedChart, seenIn } from '@/lib/evidence/chart/judge';
import type { JudgedChart } from '@/lib/evidence/chart/judged-chart';
import { recordingOf } from '@/lib/evidence/chart/recording';
import type { ChartRequirement } from '@/lib/evidence/chart/requirement';

type Drawn = { drawing: ChartDrawing; judged: JudgedChart } | { fault: string };

/**
 * The file itself, read here as the worker reads it: every change of how it is to be understood shows at once, before
 * anything is kept.
 */
export function useDrawing(
  fileId: string,
  { requirement, corrections }: { requirement: ChartRequirement | null; corrections: ChartCorrections },
) {
  const { data: bytes, error } = useQuery({
    queryKey: ['chart file', fileId],
    queryFn: async ({ signal }) => {
      const answer = await fetch(`/api/files/${fileId}/content`, { signal });
      if (!answer.ok) throw new Error('The file could not be fetched.');
      return new Uint8Array(await answer.arrayBuffer());
    },
    // What was received never changes.
    staleTime: Infinity,
  });
  const drawn = useMemo((): Drawn | null => {
    if (!bytes || !requirement) return null;
    try {
      // Judging marks open circuits in place, so each look has a recording of its own.
      const seen = seenIn(recordingOf(bytes, requirement, corrections), requirement);
      return { drawing: drawingOf(seen), judged: judgedChart(seen) };
    } catch (fault) {
      return { fault: fault instanceof Error ? fault.message : 'The chart cannot be read.' };
    }
  }, [bytes, requirement, corrections]);
  return { drawn, isLoading: !bytes && !error, error };
}
