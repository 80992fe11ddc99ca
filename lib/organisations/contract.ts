import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id } from '@/lib/api/shapes';
import { Currency, Minor } from '@/lib/money';

const Separation = z.enum(['refuse', 'record']);

/** What the shop has settled about itself, apart from the name, all of it policy of its own. */
const ShopChoices = {
  name: z.string().trim().min(1, 'Enter the name of the shop.').max(120, 'Use 120 characters or less.'),
  /** Line by line, as on a letter. */
  address: z.array(z.string().trim().min(1).max(120)).max(6, 'Use 6 lines or less.'),
  phone: z.string().trim().max(40).nullable(),
  zone: z.string().refine(isZone, 'Choose a time zone from the list.'),
  currency: Currency,
  orderPrefix: z
    .string()
    .trim()
    .toUpperCase()
    .regex(/^[A-Z0-9]{1,6}$/, 'Use 1 to 6 letters or digits.'),
  dispatchAndAcceptance: Separation,
  approvalAndPayment: Separation,
  /** Above this sum an invoice needs an admin's approval too; null: never. */
  secondApprovalAboveMinor: Minor.min(0, 'Enter 0 or more.').nullable(),
  latenessBasis: z.enum(['first_promise', 'latest_promise']),
};

export const ShopSettings = z.object({ ...ShopChoices, id: Id, zone: z.string(), version: z.int() });
export type ShopSettings = z.output<typeof ShopSettings>;

export const getShopSettings = declare({
  id: 'getShopSettings',
  method: 'get',
  path: '/settings/shop',
  summary: 'The shop and its policies',
  side: 'shop',
  permission: 'shop.read',
  input: z.object({}),
  response: ShopSettings,
});

export const updateShopSettings = declare({
  id: 'updateShopSettings',
  method: 'put',
  path: '/settings/shop',
  summary: 'Change the shop and its policies',
  side: 'shop',
  permission: 'shop.settings',
  input: z.object({ ...ShopChoices, version: z.int() }),
  response: z.object({ version: z.int() }),
});

function isZone(name: string): boolean {
  try {
    return Boolean(new Intl.DateTimeFormat('en', { timeZone: name }));
  } catch {
    return false;
  }
}
