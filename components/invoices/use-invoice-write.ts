'use client';
import { useQueryClient } from '@tanstack/react-query';

import { useWrite } from '@/components/api/use-api';
import { showMessage } from '@/components/ui/message';
import { ApiError } from '@/lib/api/client';
import type { Declaration, InputOf, OutputOf } from '@/lib/api/endpoint';
import { listAudit } from '@/lib/audit/contract';
import { getInvoice, listInvoices } from '@/lib/invoices/contract';
import { getGate } from '@/lib/stock/contract';

/** One write about an invoice: afterwards all that shows it is fresh; a refusal is told, and what it is now is fetched. */
export function useInvoiceWrite<D extends Declaration>(declaration: D) {
  const cache = useQueryClient();
  const write = useWrite(declaration, { refreshes: [getInvoice, listInvoices, listAudit, getGate] });
  /** @returns what was answered, or null where it was refused and told. */
  const run = async (input: InputOf<D>): Promise<OutputOf<D> | null> => {
    try {
      return await write.mutateAsync(input);
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      showMessage({ says: error.message, failed: true });
      await cache.invalidateQueries({ queryKey: [getInvoice.id] });
      return null;
    }
  };
  return { run, write };
}
