'use client';
import { NumberField, type NumberHit } from '@/components/shell/number-field';
import { ScanSheet } from '@/components/shell/scan-sheet';
import { call } from '@/lib/api/client';
import { listPortalBatches } from '@/lib/portal/contract';

/** Finds a batch of the processor by its number; its list is short enough to be looked through here. */
async function search(text: string): Promise<NumberHit[]> {
  const wanted = text.toLowerCase();
  const lists = await Promise.all(
    (['open', 'finished'] as const).map((show) => call(listPortalBatches, { show, limit: 200 })),
  );
  return lists
    .flatMap((list) => list.rows)
    .filter((row) => row.number.toLowerCase().includes(wanted))
    .slice(0, 20)
    .map((row) => ({
      kind: 'Batch',
      number: row.number,
      says: `${row.shop}, ${row.asked}`,
      href: `/portal/batches/${row.id}`,
    }));
}

export const PortalHeadSearch = () => <NumberField search={search} />;
export const PortalPhoneSearch = () => <ScanSheet search={search} />;
