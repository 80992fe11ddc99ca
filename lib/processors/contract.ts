import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Done, Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';
import { PROCESSES } from '@/lib/trade/process';
import { Email } from '@/lib/people/account-contract';

const Name = z.string().trim().min(1, 'Enter the name.').max(160, 'Use 160 characters or less.');
const Optional = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `Use ${most} characters or less.`)
    .transform((text) => (text === '' ? null : text))
    .nullable();

export const ProcessorRow = z.object({
  processorId: Id,
  name: z.string(),
  contactName: z.string().nullable(),
  contactEmail: z.string(),
  active: z.boolean(),
  /** Of the approvals that hold today. */
  processes: z.array(z.enum(PROCESSES)),
  /** The first day on which something it is approved for ends; null without an approval today. */
  approvalEndsOn: z.string().nullable(),
  openBatches: z.int(),
  piecesOut: z.int(),
});
export type ProcessorRow = z.output<typeof ProcessorRow>;

export const listProcessors = declare({
  id: 'listProcessors',
  method: 'get',
  path: '/processors',
  summary: 'Processors of the shop by name, with what they are approved for today and what is with them',
  side: 'shop',
  permission: 'processor.read',
  input: PageQuery.extend({ active: z.enum(['true', 'false']).optional() }),
  response: pageOf(ProcessorRow),
});

export const APPROVAL_STATES = ['holds', 'begins_later', 'ended', 'withdrawn'] as const;

export const Approval = z.object({
  id: Id,
  reference: z.string(),
  processes: z.array(z.enum(PROCESSES)),
  specifications: z.array(z.string()),
  validFrom: z.string(),
  validTo: z.string(),
  withdrawnAt: Moment.nullable(),
  state: z.enum(APPROVAL_STATES),
});
export type Approval = z.output<typeof Approval>;

export const Processor = z.object({
  processorId: Id,
  name: z.string(),
  /** The processor's own desk; only there goes an invitation to its side. */
  email: z.string(),
  phone: z.string().nullable(),
  address: z.array(z.string()),
  zone: z.string(),
  contactName: z.string().nullable(),
  contactEmail: z.string(),
  note: z.string().nullable(),
  active: z.boolean(),
  payoutsReady: z.boolean(),
  approvals: z.array(Approval),
  today: z.string(),
  version: z.int(),
});
export type Processor = z.output<typeof Processor>;

export const getProcessor = declare({
  id: 'getProcessor',
  method: 'get',
  path: '/processors/{processorId}',
  summary: 'One processor: contact and approvals',
  side: 'shop',
  permission: 'processor.read',
  input: z.object({ processorId: Id }),
  response: Processor,
});

export const addProcessor = declare({
  id: 'addProcessor',
  method: 'post',
  path: '/processors',
  summary: 'Add a processor; one that is known by this e-mail is linked, not made twice',
  side: 'shop',
  permission: 'processor.edit',
  input: z.object({
    name: Name,
    email: Email,
    phone: Optional(40).default(null),
    contactName: Optional(120).default(null),
    /** Where dispatch mails go; left out: the processor's e-mail. */
    contactEmail: Email.nullable().default(null),
    note: Optional(2000).default(null),
  }),
  response: z.object({ processorId: Id }),
});

export const updateProcessor = declare({
  id: 'updateProcessor',
  method: 'put',
  path: '/processors/{processorId}',
  summary: 'Change whom we deal with there, our note, and whether we still do',
  side: 'shop',
  permission: 'processor.edit',
  input: z.object({
    processorId: Id,
    contactName: Optional(120),
    contactEmail: Email,
    note: Optional(2000),
    active: z.boolean(),
    version: z.int(),
  }),
  response: z.object({ version: z.int() }),
});

export const addApproval = declare({
  id: 'addApproval',
  method: 'post',
  path: '/processors/{processorId}/approvals',
  summary: 'Approve a processor for processes, from a day to a day',
  side: 'shop',
  permission: 'processor.edit',
  input: z
    .object({
      processorId: Id,
      reference: z
        .string()
        .trim()
        .min(1, 'Enter the number or name of the approval.')
        .max(80, 'Use 80 characters or less.'),
      processes: z.array(z.enum(PROCESSES)).min(1, 'Choose at least one process.'),
      /** Left empty: any specification for these processes. */
      specifications: z.array(z.string().trim().min(1).max(60)).max(60).default([]),
      validFrom: Day,
      validTo: Day,
    })
    .refine(({ validFrom, validTo }) => validFrom <= validTo, {
      path: ['validTo'],
      message: 'The last day is before the first. Enter a later day.',
    }),
  response: z.object({ approvalId: Id }),
});

export const withdrawApproval = declare({
  id: 'withdrawApproval',
  method: 'post',
  path: '/processors/{processorId}/approvals/{approvalId}/withdraw',
  summary: 'Withdraw an approval from today; what was dispatched under it stays',
  side: 'shop',
  permission: 'processor.edit',
  input: z.object({
    processorId: Id,
    approvalId: Id,
    reason: z.string().trim().min(1, 'Enter the reason.').max(400, 'Use 400 characters or less.'),
  }),
  response: Done,
});

export const inviteProcessor = declare({
  id: 'inviteProcessor',
  method: 'post',
  path: '/processors/{processorId}/invitations',
  summary: 'Invite the processor, at its own e-mail, to an account that shows all its batches',
  side: 'shop',
  permission: 'processor.edit',
  input: z.object({ processorId: Id }),
  response: z.object({ email: z.string() }),
});
