import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { ChartCorrections } from '@/lib/evidence/chart/corrections';
import { JudgedChart } from '@/lib/evidence/chart/judged-chart';
import { ChartRequirement } from '@/lib/evidence/chart/requirement';
import { READING_STATES } from '@/lib/readings/reading-state';

export const ChartDetail = z.object({
  chart: z.object({ id: Id, sentBy: z.string(), createdAt: Moment }),
  file: z.object({ id: Id, name: z.string(), mediaType: z.string(), sha256: z.string().nullable() }),
  batch: z.object({ id: Id, number: z.string(), stage: z.enum(STAGES), processor: z.string() }),
  /** Null where the file was taken in before files were read. */
  state: z.enum(READING_STATES).nullable(),
  fault: z.string().nullable(),
  /** What the batch asks for, where it asks for a temperature. */
  asked: ChartRequirement.nullable(),
  /** What it was held against in the end, how it is to be understood, and the judgement. */
  kept: z
    .object({ requirement: ChartRequirement, corrections: ChartCorrections, judged: JudgedChart })
    .nullable(),
  others: z.array(z.object({ id: Id, fileName: z.string() })),
});
export type ChartDetail = z.output<typeof ChartDetail>;

export const getChart = declare({
  id: 'getChart',
  method: 'get',
  path: '/charts/{chartId}',
  summary: 'A furnace or bath chart with what was read in it',
  side: 'shop',
  permission: 'certificate.read',
  input: z.object({ chartId: Id }),
  response: ChartDetail,
});

export const JudgeChart = z.object({
  chartId: Id,
  requirement: ChartRequirement,
  corrections: ChartCorrections.default({}),
});

export const judgeChart = declare({
  id: 'judgeChart',
  method: 'post',
  path: '/charts/{chartId}/judge',
  summary: 'Hold a chart against other figures, or say how it is to be understood; it is read anew',
  side: 'shop',
  permission: 'certificate.prove',
  input: JudgeChart,
  response: z.object({ state: z.enum(READING_STATES) }),
});
