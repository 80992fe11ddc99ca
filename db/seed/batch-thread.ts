import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';
import { cancelBatch } from '@/lib/batches/cancel-batch';
import { createBatch } from '@/lib/batches/create-batch';
import { dispatchBatch } from '@/lib/batches/dispatch-batch';
import { setRequirements } from '@/lib/batches/set-requirements';
import { acknowledgeBatch } from '@/lib/portal/acknowledge-batch';
import { promiseDay } from '@/lib/portal/promise-day';
import { sendPaper } from '@/lib/portal/send-paper';
import { shipBatch } from '@/lib/portal/ship-batch';
import { writeToShop } from '@/lib/portal/write-to-shop';
import { countIn } from '@/lib/receipts/count-in';
import { getReceiving } from '@/lib/receipts/queries';
import { raiseNonconformance } from '@/lib/nonconformances/raise-nonconformance';
import { releasePieces } from '@/lib/stock/release-pieces';
import { getGate } from '@/lib/stock/queries';

import { certificateOf, invoiceOf, keepPaper } from './batch-papers';
import type { BatchPlot, Crew } from './batch-plot';
import { recordOfSolution } from './furnace-record';
import { proveCertificate } from './prove';
import { payThrough } from './pay';
import { addDays, dayOf, type DemoPerson } from './organisations';
import type { StagePlay } from './stage-play';

/** Plays one batch from being built to being stocked, as far as its plot goes. */
export async function* batchThread(
  play: StagePlay,
  crew: Crew,
  plot: BatchPlot,
): AsyncGenerator<Date, string, void> {
  const at = (days: number, hour = 9): Date =>
    new Date(addDays(plot.begun, days).getTime() + (hour - 9) * 3600 * 1000);
  const inYard = <T>(person: DemoPerson, when: Date, work: Parameters<StagePlay['asPerson']>[2]) =>
    play.asPerson(person, when, work, crew.shopId) as Promise<T>;

  yield at(0);
  const batchId = await inYard<string>(crew.lead, at(0), async (ctx) => {
    const made = await createBatch(ctx, {
      processorId: plot.processor.id,
      lines: plot.lines.map((line) => ({ ...line })),
      leavesOn: dayOf(at(plot.leavesInDays)),
      wantedBackOn: dayOf(at(plot.wantedInDays)),
      lotMinimumMinor: plot.lotMinimumMinor ?? 18_000,
      certificationFeeMinor: plot.certificationFeeMinor ?? 2_500,
    });
    if (plot.wholeBatch)
      await setRequirements(ctx, {
        batchId: made.id,
        version: made.version,
        lineId: null,
        requirements: [...plot.wholeBatch],
      });
    return made.id;
  });
  if (plot.dispatchedAfter === undefined) return batchId;

  yield at(plot.dispatchedAfter, 8);
  await inYard(crew.lead, at(plot.dispatchedAfter, 8), async (ctx) => {
    return dispatchBatch(ctx, { batchId, version: await versionOf(ctx, batchId) });
  });
  yield* atTheProcessor(play, plot, { batchId, at });
  if (plot.cancelled) {
    const { after, reason } = plot.cancelled;
    yield at(after, 11);
    await inYard(crew.lead, at(after, 11), async (ctx) =>
      cancelBatch(ctx, { batchId, version: await versionOf(ctx, batchId), reason }),
    );
  }
  if (plot.receivedAfter === undefined) return batchId;

  yield at(plot.receivedAfter, 14);
  await inYard(crew.inspector, at(plot.receivedAfter, 14), (ctx) =>
    countBack(ctx, batchId, plot.missing ?? 0),
  );
  if (plot.papersAfter === undefined) return batchId;

  yield at(plot.papersAfter, 15);
  const certificateId = await play.asProcessor(plot.processor, at(plot.papersAfter, 15), async (ctx) => {
    const paper = await certificateOf(ctx, batchId, {
      processor: plot.processor,
      uncovered: plot.uncovered ?? 0,
      missing: plot.missing ?? 0,
      stated: plot.states ?? {},
    });
    const fileId = await keepPaper(ctx, batchId, { ...paper, purpose: 'certificate' });
    return (await sendPaper(ctx, { batchId, kind: 'certificate', fileId })).id;
  });
  if (plot.soakedMin !== undefined) {
    const { soakedMin } = plot;
    yield at(plot.papersAfter, 15);
    await play.asProcessor(plot.processor, at(plot.papersAfter, 15), async (ctx) => {
      const fileId = await keepPaper(ctx, batchId, {
        name: 'furnace-2-load-a.csv',
        content: recordOfSolution({ endedAt: at(plot.papersAfter ?? 0, 9), soakedMin }),
        mediaType: 'text/csv',
        purpose: 'chart',
      });
      await sendPaper(ctx, { batchId, kind: 'chart', fileId });
    });
  }
  if (plot.held) {
    yield at(plot.held.after, 10);
    const { held } = plot;
    await inYard(crew.inspector, at(held.after, 10), async (ctx) => {
      const { lines } = await getGate(ctx, { batchId });
      await raiseNonconformance(ctx, {
        batchId,
        lineId: lines.at(-1)?.lineId ?? '',
        kind: 'requirement',
        pieces: held.pieces,
        what: held.what,
        requirementId: null,
        certificateId,
        pieceIds: [],
      });
    });
  }
  if (plot.provedAfter !== undefined) {
    yield at(plot.provedAfter, 11);
    await inYard(crew.inspector, at(plot.provedAfter, 11), (ctx) =>
      proveCertificate(ctx, {
        batchId,
        certificateId,
        uncovered: plot.uncovered ?? 0,
        datedOn: dayOf(at(plot.papersAfter ?? 0)),
      }),
    );
  }
  yield* toTheMoney(play, crew, plot, { batchId, at });
  return batchId;
}

async function versionOf(ctx: Ctx, batchId: string): Promise<number> {
  const [row] = await ctx.tx
    .select({ version: batches.version })
    .from(batches)
    .where(eq(batches.id, batchId));
  return row?.version ?? 1;
}

interface Scene {
  batchId: string;
  at(days: number, hour?: number): Date;
}

async function* atTheProcessor(
  play: StagePlay,
  plot: BatchPlot,
  { batchId, at }: Scene,
): AsyncGenerator<Date, void, void> {
  const [first, ...later] = plot.promises ?? [];
  if (plot.acknowledgedAfter !== undefined) {
    yield at(plot.acknowledgedAfter, 10);
    await play.asProcessor(plot.processor, at(plot.acknowledgedAfter, 10), (ctx) =>
      acknowledgeBatch(ctx, { batchId, promisedOn: first === undefined ? null : dayOf(at(first)), note: '' }),
    );
  }
  if (plot.question) {
    yield at(plot.question.after, 11);
    const { after, body } = plot.question;
    await play.asProcessor(plot.processor, at(after, 11), (ctx) =>
      writeToShop(ctx, { batchId, lineId: null, kind: 'question', body, answersId: null }),
    );
  }
  let promised = first ?? 0;
  for (const day of later) {
    yield at(promised, 16);
    const when = at(promised, 16);
    await play.asProcessor(plot.processor, when, (ctx) =>
      promiseDay(ctx, { batchId, promisedOn: dayOf(at(day)), note: 'Furnace down for survey.' }),
    );
    promised = day;
  }
  if (plot.shippedAfter !== undefined) {
    yield at(plot.shippedAfter, 13);
    await play.asProcessor(plot.processor, at(plot.shippedAfter, 13), (ctx) =>
      shipBatch(ctx, { batchId, note: 'with the yard van' }),
    );
  }
}

async function countBack(ctx: Ctx, batchId: string, missing: number): Promise<void> {
  const { lines } = await getReceiving(ctx, { batchId });
  const counted = lines.map((line, at) => {
    const good = line.away - (at === lines.length - 1 ? missing : 0);
    const names = line.serialised ? line.awayPieces.map((piece) => piece.id) : [];
    return {
      lineId: line.id,
      good,
      damaged: 0,
      short: 0,
      over: 0,
      note: '',
      goodPieceIds: names.slice(0, good),
      damagedPieceIds: [],
    };
  });
  await countIn(ctx, { batchId, note: '', lines: counted, photos: [] });
}

async function* toTheMoney(
  play: StagePlay,
  crew: Crew,
  plot: BatchPlot,
  { batchId, at }: Scene,
): AsyncGenerator<Date, void, void> {
  const inYard = <T>(person: DemoPerson, when: Date, work: Parameters<StagePlay['asPerson']>[2]) =>
    play.asPerson(person, when, work, crew.shopId) as Promise<T>;
  if (plot.invoicedAfter !== undefined) {
    yield at(plot.invoicedAfter, 16);
    const when = at(plot.invoicedAfter, 16);
    const invoiceId = await play.asProcessor(plot.processor, when, async (ctx) => {
      const paper = await invoiceOf(ctx, batchId, { processor: plot.processor, extra: plot.invoiceExtra });
      const fileId = await keepPaper(ctx, batchId, { ...paper, purpose: 'invoice' });
      return (await sendPaper(ctx, { batchId, kind: 'invoice', fileId })).id;
    });
    if (plot.enteredAfter !== undefined) {
      yield at(plot.enteredAfter, 9);
      await inYard(crew.office, at(plot.enteredAfter, 9), (ctx) =>
        payThrough(ctx, { batchId, invoiceId, extra: plot.invoiceExtra, pay: false, datedOn: dayOf(when) }),
      );
    }
    if (plot.paidAfter !== undefined) {
      yield at(plot.paidAfter, 9);
      await inYard(crew.office, at(plot.paidAfter, 9), (ctx) =>
        payThrough(ctx, { batchId, invoiceId, extra: plot.invoiceExtra, pay: true, datedOn: dayOf(when) }),
      );
    }
  }
  if (plot.releasedAfter !== undefined) {
    yield at(plot.releasedAfter, 10);
    await inYard(crew.inspector, at(plot.releasedAfter, 10), async (ctx) => {
      const { lines } = await getGate(ctx, { batchId });
      const passing = lines.filter((line) => line.mayPass > 0);
      await releasePieces(ctx, {
        batchId,
        lines: passing.map((line) => ({
          lineId: line.lineId,
          pieces: line.mayPass,
          locationId: line.nextProcess === null ? crew.locationId : null,
        })),
      });
    });
  }
}
