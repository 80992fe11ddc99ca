import { createLot } from '@/lib/lots/create-lot';
import { getPart } from '@/lib/parts/queries';
import type { Process } from '@/lib/trade/process';

import type { BatchPlot, Crew } from './batch-plot';
import { batchThread } from './batch-thread';
import { keepFile } from './keep-file';
import { addDays, dayOf, type DemoOrganisations, type DemoProcessor } from './organisations';
import { makeForm } from './papers';
import type { StagePlay, Thread } from './stage-play';

/** A price a piece for each process, in cents: invented, of the size that small work costs. */
const PRICES: Partial<Record<Process, number>> = {
  solution_heat_treat_and_age: 620,
  harden_and_temper: 1_450,
  artificial_age: 780,
  stress_relief: 1_900,
  cadmium_plate: 540,
  anodize: 480,
  chemical_film: 260,
  passivation: 310,
  fluorescent_penetrant: 1_150,
  magnetic_particle: 980,
  shot_peen: 1_300,
};

type Plot = Omit<BatchPlot, 'processor' | 'lines' | 'begun'>;

/** Lots of some parts that are made together and go through their outside steps together. */
export interface Campaign {
  parts: readonly (readonly [number: string, pieces: number])[];
  startedDaysAgo: number;
  /** One plot a step of the route; where there are fewer, the rest has not begun. */
  steps: readonly Plot[];
}

/** What a batch does when nothing goes wrong. */
export const SMOOTH: Plot = {
  leavesInDays: 1,
  wantedInDays: 14,
  dispatchedAfter: 1,
  acknowledgedAfter: 2,
  promises: [11],
  shippedAfter: 10,
  receivedAfter: 12,
  papersAfter: 12,
  provedAfter: 13,
  invoicedAfter: 13,
  enteredAfter: 14,
  paidAfter: 15,
  releasedAfter: 16,
};
const DAYS_OF_A_STEP = 18;

interface Setting {
  play: StagePlay;
  crew: Crew;
  /** Part ids by drawing number. */
  parts: ReadonlyMap<string, string>;
}

/** Makes the lots, then sends them through one step after the other. */
export async function* campaignThread({ play, crew, parts }: Setting, campaign: Campaign): Thread {
  const begun = addDays(play.today, -campaign.startedDaysAgo);
  yield begun;
  const lots = await makeLots({ play, crew, parts }, campaign, begun);
  for (const [at, plot] of campaign.steps.entries()) {
    const lines = lots.flatMap((lot) => {
      const step = lot.route[at];
      return step
        ? [
            {
              lotId: lot.id,
              stepId: step.id,
              pieces: lot.pieces,
              unitPriceMinor: PRICES[step.process] ?? 500,
              process: step.process,
            },
          ]
        : [];
    });
    const [first] = lines;
    if (!first) return;
    const processor = processorFor(play.cast, first.process);
    yield* batchThread(play, crew, {
      ...plot,
      processor,
      begun: addDays(begun, 1 + at * DAYS_OF_A_STEP),
      lines: lines.map(({ process: _, ...line }) => line),
    });
  }
}

async function makeLots({ play, crew, parts }: Setting, campaign: Campaign, begun: Date) {
  return play.asPerson(
    crew.lead,
    begun,
    async (ctx) => {
      const made = [];
      for (const [number, pieces] of campaign.parts) {
        const partId = parts.get(number) ?? '';
        const part = await getPart(ctx, { partId });
        const heat = `${String.fromCharCode(65 + (pieces % 20))}${String(campaign.startedDaysAgo * 37 + pieces).padStart(5, '4')}`;
        const content = await makeForm({
          title: 'Mill test report',
          from: { name: 'Farrier Lake Rolling', address: 'Mill Quay 3, Farrier Lake' },
          facts: [
            ['Heat', heat],
            ['Alloy', part.alloy],
            ['Product', part.form],
            ['Condition', part.madeCondition],
            ['Size', part.thickness?.entered ?? ''],
            ['Date', dayOf(addDays(begun, -30))],
          ],
          columns: ['Property', 'Result'],
          lines: [
            { cells: ['Chemistry', 'within the specification'] },
            { cells: ['Tensile', 'within the specification'] },
          ],
          statements: ['The material was made and tested to the order. Invented for demonstration.'],
          signed: { name: 'M. Sorrel', role: 'Laboratory', day: dayOf(addDays(begun, -30)) },
          at: begun,
        });
        const millCertificateFileId = await keepFile(ctx, {
          purpose: 'mill_certificate',
          name: `mill ${heat}.pdf`,
          mediaType: 'application/pdf',
          content,
        });
        const serials = part.serialised
          ? Array.from(
              { length: pieces },
              (_, at) => `${number.slice(-2)}-${campaign.startedDaysAgo}-${String(at + 1).padStart(2, '0')}`,
            )
          : [];
        const lot = await createLot(ctx, {
          partId,
          number: '',
          heat,
          madeOn: dayOf(begun),
          pieces: part.serialised ? null : pieces,
          serials,
          millCertificateFileId,
          note: '',
        });
        made.push({ id: lot.id, pieces, route: part.route });
      }
      return made;
    },
    crew.shopId,
  );
}

function processorFor({ processors }: DemoOrganisations, process: Process): DemoProcessor {
  const found = Object.values(processors).find((one) => one.processes.includes(process));
  if (!found) throw new Error(`nobody in the story does ${process}`);
  return found;
}
