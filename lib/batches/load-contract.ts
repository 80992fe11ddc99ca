import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id } from '@/lib/api/shapes';
import { QUENCH_MEDIA } from '@/lib/trade/tables/quench-media';

import { BatchRef, LoadNo, Seen } from './contract';

const Span = z.tuple([z.number(), z.number()]);
const LineOfLoad = z.object({
  lineId: Id,
  lineNo: z.int(),
  partName: z.string(),
  thickness: z.string(),
  clad: z.boolean(),
  /** What it would soak alone, minutes; clad metal has a longest time. Null where it is aged only. */
  soak: z.object({ soakMin: z.number(), longestMin: z.number().nullable() }).nullable(),
});

export const PlannedLoad = z.object({
  number: z.int(),
  lines: z.array(LineOfLoad),
  /** The line whose thickness governs the soak. */
  governing: z.object({ lineId: Id, lineNo: z.int(), thickness: z.string(), thicknessMm: z.number() }),
  pieces: z.int(),
  /** Of all pieces; null where a part says none and none can be computed. */
  mass: z.object({ massG: z.number(), isComputed: z.boolean() }).nullable(),
  /** Null where the load is aged only. Temperature in °C, times in minutes. */
  solution: z
    .object({
      temperatureC: Span,
      soakMin: z.number(),
      longestMin: z.number().nullable(),
      medium: z.enum(['air', 'salt']),
      quench: z.enum(QUENCH_MEDIA),
      /** Seconds from furnace into quench. */
      maxDelayS: z.number().nullable(),
    })
    .nullable(),
  /** Ageing that would do: each a list of holds in the oven. None where it lies at room temperature. */
  ageing: z.array(
    z.object({
      holds: z.array(z.object({ setC: Span, holdMin: Span.nullable() })),
      source: z.string(),
    }),
  ),
  sources: z.array(z.string()),
});
export type PlannedLoad = z.output<typeof PlannedLoad>;

export const LoadPlan = z.object({
  /** `exact`: no plan has fewer loads. Null: the process is not planned in furnace loads. */
  method: z.enum(['exact', 'good']).nullable(),
  loads: z.array(PlannedLoad),
  apart: z.array(
    z.object({
      between: z.tuple([z.array(z.int()), z.array(z.int())]),
      reason: z.string(),
      says: z.string(),
      source: z.string().nullable(),
    }),
  ),
  unplaced: z.array(z.object({ lineId: Id, lineNo: z.int(), reason: z.string(), says: z.string() })),
  /** The lines lie in exactly these loads now. */
  isSet: z.boolean(),
});
export type LoadPlan = z.output<typeof LoadPlan>;

export const getLoadPlan = declare({
  id: 'getLoadPlan',
  method: 'get',
  path: '/batches/{batchId}/load-plan',
  summary: 'The fewest furnace loads that the lines of a batch may share, and why lines are kept apart',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: LoadPlan,
});

export const setLoads = declare({
  id: 'setBatchLoads',
  method: 'put',
  path: '/batches/{batchId}/loads',
  summary: 'Say in which load lines go; lines that are not named stay where they are',
  side: 'shop',
  permission: 'batch.build',
  input: Seen.extend({
    loads: z
      .array(z.object({ lineId: Id, loadNo: LoadNo.nullable() }))
      .min(1, 'Name at least one line.')
      .max(1000),
  }),
  response: BatchRef,
});
