import type { MailGiven, MailTemplate } from '@/emails/mail-props';

const stated = { zone: 'America/Chicago', statedAt: '2026-06-17T12:12:00Z' };
const ofBatch = {
  ...stated,
  shop: 'Heron Reach Floatworks',
  processor: 'Ostrow Heat Treating',
  batchNumber: 'B-0419',
  orderNumber: 'TS-1187',
  pieces: 60,
  contact: { name: 'Ines Halloran', phone: '555 0117' },
};
const dispatch = {
  ...ofBatch,
  asked: 'solution and quench to T42',
  specification: 'AMS 2770R',
  wantedBackOn: '2026-06-30',
  lines: [
    {
      lineNo: 1,
      part: 'FL-4418-03 C',
      description: 'Bulkhead web, sta 62, 2024 clad sheet, 0.032 in',
      loadNo: 1,
      pieces: 46,
    },
    { lineNo: 2, part: 'FL-4410-12 D', description: 'Keel doubler <aft> & more', loadNo: 2, pieces: 14 },
  ],
  cautions: ['Do not straighten later than 2 h after quench'],
  note: 'The van comes about 10:00.',
  url: 'http://localhost:4600/b/a-token-of-32-letters-or-so-1234567',
  version: 1,
};
const message = {
  ...ofBatch,
  stage: 'at_processor',
  to: 'shop',
  kind: 'question',
  author: 'Ruth Amador',
  body: 'Line 2 has burrs.\nShall we take them off <before> quench?',
  about: 'line 2, FL-4410-12 D',
  answers: null,
  url: 'http://localhost:4600/batches/0198f7a0-0000-7000-8000-000000000000#messages',
} as const;
const account = {
  ...stated,
  name: 'Ines',
  url: 'http://localhost:4600/sign-in/link/abc',
  expiresAt: '2026-06-17T12:42:00Z',
};

/** One of each mail, with names that a mail program must not take for markup. */
export const sampleMails: { [T in MailTemplate]: MailGiven<T> } = {
  dispatch,
  'dispatch-reissued': {
    ...dispatch,
    version: 2,
    changes: ['Line 2: 14 pieces instead of 12', 'Back by 30 Jun instead of 26 Jun'],
  },
  'batch-cancelled': { ...ofBatch, reason: 'The drawing has changed.' },
  'batch-link': {
    ...ofBatch,
    stage: 'at_processor',
    asked: dispatch.asked,
    specification: dispatch.specification,
    wantedBackOn: dispatch.wantedBackOn,
    url: dispatch.url,
  },
  message,
  trouble: { ...message, kind: 'trouble' },
  remittance: {
    ...ofBatch,
    stage: 'settled',
    invoiceNumber: '26-1187',
    invoiceDatedOn: '2026-06-10',
    currency: 'USD',
    lines: [
      { says: 'Solution heat treat', pieces: 60, amountMinor: 123_40 },
      { says: 'Certification', pieces: null, amountMinor: 1_500_00 },
    ],
    withheld: [{ says: '2 pieces scrapped', amountMinor: 4_60 }],
    paidMinor: 1_618_80,
    paidAt: '2026-06-17T12:00:00Z',
    reference: 'B-0419 26-1187',
  },
  'invoice-refused': {
    ...ofBatch,
    stage: 'proved',
    invoiceNumber: '26-1187',
    invoiceDatedOn: '2026-06-10',
    currency: 'USD',
    totalMinor: 1_623_40,
    reason: 'The order says 58 pieces.\nThe lot charge stands twice.',
    url: dispatch.url,
  },
  invitation: {
    ...account,
    organisation: 'Heron Reach Floatworks',
    inviter: 'Tobias',
    roles: ['lead', 'inspector', 'office'],
  },
  reset: account,
  'sign-in': account,
};
