'use client';
import { useQueryClient } from '@tanstack/react-query';
import { useRef } from 'react';

import { useWrite } from '@/components/api/use-api';
import { showMessage } from '@/components/ui/message';
import { ApiError } from '@/lib/api/client';
import type { Declaration, InputOf, OutputOf } from '@/lib/api/endpoint';
import { listAudit } from '@/lib/audit/contract';
import { getBatchChecks } from '@/lib/batches/check-contract';
import { getBatch, getBatchLines, listBatches } from '@/lib/batches/contract';
import { getLoadPlan } from '@/lib/batches/load-contract';
import { getTraveller, listBatchDocuments } from '@/lib/batches/paper-contract';
import { listWaitingLots, listWaitingSteps } from '@/lib/batches/waiting-contract';
import { proposeForBatch } from '@/lib/requirements/contract';
import { getGate } from '@/lib/stock/contract';

const SHOWN = [
  getBatch,
  getBatchLines,
  getBatchChecks,
  getLoadPlan,
  getTraveller,
  listBatchDocuments,
  listBatches,
  listWaitingLots,
  listWaitingSteps,
  listAudit,
  proposeForBatch,
  getGate,
];

/** One write about a batch: afterwards all that shows it is fresh. A refusal is told, and what it is now is fetched. */
export function useBatchWrite<D extends Declaration>(declaration: D, onRefused?: (error: ApiError) => void) {
  const cache = useQueryClient();
  const write = useWrite(declaration, { refreshes: SHOWN });
  // Two presses in one moment come before the button is drawn as busy.
  const running = useRef(false);
  /** @returns what was answered, or null where it was refused and told, or is being done already. */
  const run = async (input: InputOf<D>): Promise<OutputOf<D> | null> => {
    if (running.current) return null;
    running.current = true;
    try {
      return await write.mutateAsync(input);
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      if (onRefused && (error.problem.fields ?? []).length > 0) onRefused(error);
      else showMessage({ says: error.message, failed: true });
      if (error.problem.status === 409)
        await Promise.all(
          [getBatch, getBatchLines, getBatchChecks].map((read) =>
            cache.invalidateQueries({ queryKey: [read.id] }),
          ),
        );
      return null;
    } finally {
      running.current = false;
    }
  };
  return { run, busy: write.isPending };
}
