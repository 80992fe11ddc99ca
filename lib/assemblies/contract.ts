import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Done, Id, Moment, Pieces } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { PROCESSES } from '@/lib/trade/process';

const Need = z.object({
  partNumber: z.string().trim().min(1, 'Enter the part number.').max(80),
  pieces: Pieces,
});

const Needs = z
  .array(Need)
  .max(500)
  .superRefine((needs, issues) => {
    needs.forEach((need, at) => {
      if (needs.findIndex((other) => other.partNumber === need.partNumber) < at)
        issues.addIssue({
          code: 'custom',
          path: [at, 'partNumber'],
          message: 'This part is in the list already. Change its pieces there.',
        });
    });
  });

const Fields = z.object({
  name: z.string().trim().min(1, 'Give the assembly a name.').max(80, 'Write 80 characters or less.'),
  neededOn: Day.nullable(),
  note: z.string().trim().max(1000).nullable().default(null),
  needs: Needs,
});

/** A batch that carries a part, with where its pieces of that part are. */
export const Wait = z.object({
  id: Id,
  number: z.string(),
  stage: z.enum(STAGES),
  processor: z.string(),
  promisedOn: z.string().nullable(),
  /** All below together. */
  pieces: z.int(),
  packed: z.int(),
  away: z.int(),
  back: z.int(),
  held: z.int(),
});
export type Wait = z.output<typeof Wait>;

export const AssemblyRow = z.object({
  id: Id,
  name: z.string(),
  neededOn: z.string().nullable(),
  needed: z.int(),
  ready: z.int(),
  closedAt: Moment.nullable(),
  batches: z.array(Wait),
});
export type AssemblyRow = z.output<typeof AssemblyRow>;

export const listAssemblies = declare({
  id: 'listAssemblies',
  method: 'get',
  path: '/assemblies',
  summary: 'Open assemblies, earliest need first, with how far each is; or those closed last',
  side: 'shop',
  permission: 'assembly.read',
  input: z.object({ closed: z.enum(['0', '1']).default('0') }),
  response: z.object({ today: z.string(), rows: z.array(AssemblyRow) }),
});

export const AssemblyNeedRow = z.object({
  partNumber: z.string(),
  partId: Id.nullable(),
  partName: z.string().nullable(),
  pieces: z.int(),
  fitted: z.int(),
  /** In stock and counted for this assembly alone. */
  inStock: z.int(),
  /** Lots in stock that could be issued now. */
  stock: z.array(
    z.object({ lotId: Id, lotNumber: z.string(), locationId: Id, location: z.string(), pieces: z.int() }),
  ),
  batches: z.array(Wait),
  /** In the yard, not on any batch, by the outside step they wait for. */
  waiting: z.array(z.object({ process: z.enum(PROCESSES), pieces: z.int() })),
  /** Which lots went into it. */
  fittedLots: z.array(
    z.object({
      lotId: Id,
      lotNumber: z.string(),
      pieces: z.int(),
      named: z.array(z.object({ id: Id, serial: z.string() })),
    }),
  ),
});
export type AssemblyNeedRow = z.output<typeof AssemblyNeedRow>;

export const getAssembly = declare({
  id: 'getAssembly',
  method: 'get',
  path: '/assemblies/{assemblyId}',
  summary: 'One assembly: what it needs, what is fitted, in stock, and where the rest is',
  side: 'shop',
  permission: 'assembly.read',
  input: z.object({ assemblyId: Id }),
  response: z.object({
    id: Id,
    name: z.string(),
    neededOn: z.string().nullable(),
    note: z.string().nullable(),
    closed: z.boolean(),
    version: z.int(),
    today: z.string(),
    needs: z.array(AssemblyNeedRow),
  }),
});

export const createAssembly = declare({
  id: 'createAssembly',
  method: 'post',
  path: '/assemblies',
  summary: 'Enter an assembly and the parts it needs',
  side: 'shop',
  permission: 'assembly.edit',
  input: Fields,
  response: z.object({ id: Id }),
});

export const updateAssembly = declare({
  id: 'updateAssembly',
  method: 'put',
  path: '/assemblies/{assemblyId}',
  summary: 'Change an assembly and what it needs',
  side: 'shop',
  permission: 'assembly.edit',
  input: Fields.extend({ assemblyId: Id, version: z.int() }),
  response: z.object({ version: z.int() }),
});

export const closeAssembly = declare({
  id: 'closeAssembly',
  method: 'post',
  path: '/assemblies/{assemblyId}/close',
  summary: 'Close an assembly: it waits for nothing more',
  side: 'shop',
  permission: 'assembly.edit',
  input: z.object({ assemblyId: Id, version: z.int() }),
  response: Done,
});
