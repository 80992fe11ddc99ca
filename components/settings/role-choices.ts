import type { ShopRole } from '@/lib/auth/roles';

/** What each role is for, in the words of the shop. */
export const ROLE_CHOICES: readonly { value: ShopRole; says: string; note: string }[] = [
  { value: 'lead', says: 'lead', note: 'parts, lots, builds and dispatches batches, fits' },
  { value: 'inspector', says: 'inspector', note: 'counts in, proves and signs, holds, approves processors' },
  { value: 'office', says: 'office', note: 'invoices and payments' },
  { value: 'admin', says: 'admin', note: 'people, policies, overrides, second approvals' },
  { value: 'auditor', says: 'auditor', note: 'reads everything, changes nothing' },
];
