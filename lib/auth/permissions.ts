import type { Role } from './roles';

const EVERYONE_IN_SHOP = ['lead', 'inspector', 'office', 'admin', 'auditor'] as const;

/**
 * Who may do what: the one table. A route names its permission, `authorize` reads it here, and a test walks every
 * route with every role against it. `everyone` needs no sign-in at all.
 */
export const PERMISSIONS = {
  'shop.read': EVERYONE_IN_SHOP,
  'shop.settings': ['admin'],
  'people.manage': ['admin'],
  'self.manage': ['lead', 'inspector', 'office', 'admin', 'auditor', 'processor'],
  'token.manage': EVERYONE_IN_SHOP,
  'audit.read': ['admin', 'auditor', 'inspector', 'lead', 'office'],
  'jobs.manage': ['admin'],
  'search.use': EVERYONE_IN_SHOP,

  'reference.read': EVERYONE_IN_SHOP,
  'reference.edit': ['lead', 'admin'],

  'part.read': EVERYONE_IN_SHOP,
  'part.edit': ['lead', 'admin'],
  'lot.read': EVERYONE_IN_SHOP,
  'lot.create': ['lead', 'admin'],
  'assembly.read': EVERYONE_IN_SHOP,
  'assembly.edit': ['lead', 'admin'],
  'processor.read': EVERYONE_IN_SHOP,
  'processor.edit': ['admin', 'inspector'],

  'batch.read': EVERYONE_IN_SHOP,
  'batch.build': ['lead', 'admin'],
  'batch.override': ['admin'],
  'batch.dispatch': ['lead', 'admin'],
  'batch.message': ['lead', 'inspector', 'office', 'admin'],

  'receipt.read': EVERYONE_IN_SHOP,
  'receipt.count': ['lead', 'inspector', 'admin'],
  'certificate.read': EVERYONE_IN_SHOP,
  'certificate.add': ['lead', 'inspector', 'office', 'admin'],
  'certificate.prove': ['inspector'],
  'nonconformance.read': EVERYONE_IN_SHOP,
  'nonconformance.raise': ['lead', 'inspector', 'admin'],
  'nonconformance.disposition': ['inspector'],

  'invoice.read': EVERYONE_IN_SHOP,
  'invoice.enter': ['office', 'admin'],
  'invoice.approve': ['office', 'admin'],
  'invoice.approve_second': ['admin'],
  'invoice.pay': ['office', 'admin'],
  'payment.waive': ['admin', 'office'],

  'stock.read': EVERYONE_IN_SHOP,
  'stock.release': ['inspector', 'lead', 'admin'],
  'stock.fit': ['lead', 'admin'],
  'dossier.read': EVERYONE_IN_SHOP,
  'dossier.share': ['inspector', 'admin'],

  'file.read': [...EVERYONE_IN_SHOP, 'processor'],
  'file.add': ['lead', 'inspector', 'office', 'admin', 'processor'],

  'portal.read': ['processor'],
  'portal.answer': ['processor'],
  'portal.account': ['processor'],

  'public.use': 'everyone',
} as const satisfies Record<string, readonly Role[] | 'everyone'>;

export type Permission = keyof typeof PERMISSIONS;

/** Permissions a token may carry as scopes; nothing that needs a person's own hand (signing, paying, dispatching asks again). */
export const TOKEN_SCOPES: readonly Permission[] = (Object.keys(PERMISSIONS) as Permission[]).filter(
  (name) =>
    ![
      'public.use',
      'self.manage',
      'token.manage',
      'certificate.prove',
      'invoice.pay',
      'portal.read',
      'portal.answer',
      'portal.account',
    ].includes(name),
);
