import { connect, withTenant, type Tenant } from '@/db/client';
import type { Ctx } from '@/lib/auth/context';
import { createBatch } from '@/lib/batches/create-batch';
import { newId } from '@/lib/ids';
import { createLot } from '@/lib/lots/create-lot';
import { createPart } from '@/lib/parts/create-part';
import { getPart } from '@/lib/parts/queries';
import { listProcessors } from '@/lib/processors/queries';

import type { Filled } from './fill';

const COUNT = 100;
const LINES = 5;

/** A hundred batches of five lines, built and ready, and for each the call that dispatches it. */
export async function dispatches(
  appUrl: string,
  { shopId, userId }: Filled,
  { base, headers }: { base: string; headers: Record<string, string> },
): Promise<(() => Promise<void>)[]> {
  const { db, pool } = connect(appUrl, 4);
  const tenant: Tenant = { kind: 'shop', shopId, personId: userId };
  const act = <T>(work: (ctx: Ctx) => Promise<T>) =>
    withTenant(db, tenant, (tx) =>
      work({
        tenant,
        actor: {
          kind: 'person',
          userId,
          name: 'Bench Lead',
          roles: ['lead', 'inspector', 'office', 'admin'],
        },
        tx,
        now: new Date(),
        requestId: newId(),
        address: null,
      }),
    );
  try {
    const ready = await act(async (ctx) => {
      const step = {
        process: 'solution_heat_treat_and_age' as const,
        specification: 'AMS 2770',
        specificationRevision: 'R',
        classType: '',
        conditionBefore: 'O',
        targetCondition: 'T42',
        note: '',
        ordering: {},
        toProve: [
          {
            characteristic: 'Hardness',
            limit: '63 or more',
            unit: 'HRB',
            source: 'specification' as const,
            sourceText: '',
          },
        ],
      };
      const made = await createPart(ctx, {
        number: 'BENCH-1',
        revision: 'A',
        name: 'Bench bracket',
        alloy: '2024',
        form: 'sheet',
        clad: false,
        thickness: '0.040 in',
        madeCondition: 'O',
        endCondition: 'T42',
        length: '',
        width: '',
        height: '',
        mass: '',
        area: '',
        serialised: false,
        note: '',
        drawingFileId: null,
        route: [step],
      });
      const { route } = await getPart(ctx, { partId: made.id });
      const [processor] = (await listProcessors(ctx, { limit: 1, active: undefined, after: undefined })).rows;
      return { partId: made.id, stepId: route[0]?.id ?? '', processorId: processor?.processorId ?? '' };
    });
    const batches = [];
    for (let at = 0; at < COUNT; at++) {
      batches.push(
        await act(async (ctx) => {
          const lines = [];
          for (let line = 0; line < LINES; line++) {
            const lot = await createLot(ctx, {
              partId: ready.partId,
              number: '',
              heat: 'H-1',
              madeOn: '',
              pieces: 10,
              serials: [],
              millCertificateFileId: null,
              note: '',
            });
            lines.push({ lotId: lot.id, stepId: ready.stepId, pieces: 10, unitPriceMinor: 500 });
          }
          return createBatch(ctx, { processorId: ready.processorId, lines, wantedBackOn: '2099-01-01' });
        }),
      );
    }
    return batches.map((batch) => async () => {
      const response = await fetch(`${base}/api/batches/${batch.id}/dispatch`, {
        method: 'POST',
        headers: { ...headers, 'content-type': 'application/json' },
        body: JSON.stringify({ version: batch.version }),
      });
      if (!response.ok) throw new Error(`dispatch was refused: ${await response.text()}`);
      await response.text();
    });
  } finally {
    await pool.end();
  }
}
