import { expect, test } from 'vitest';

import { openOf, workGroups } from '@/components/portal/work-groups';
import type { PortalRow } from '@/lib/portal/contract';

const clock = { zone: 'UTC', now: new Date('2026-04-16T12:00:00Z') };
const MOMENT = '2026-04-10T12:00:00Z';
const row = (part: Partial<PortalRow> = {}): PortalRow => ({
  id: 'b',
  number: 'B-0001',
  stage: 'at_processor',
  shopId: 's',
  shop: 'Merganser Cove Aircraft',
  pieces: 10,
  piecesBack: 0,
  parts: [],
  materials: [],
  thicknesses: [],
  asked: 'anodize',
  dispatchedAt: MOMENT,
  acknowledgedAt: MOMENT,
  wantedBackOn: null,
  promisedOn: '2026-04-20',
  markedDoneAt: null,
  shippedAt: null,
  lastBackAt: null,
  certificates: 0,
  invoices: 0,
  asksMe: false,
  answered: false,
  ...part,
});
const groupOf = (part: Partial<PortalRow>) => workGroups([row(part)], clock).map((group) => group.says);

test.each([
  ['promised and passed', { promisedOn: '2026-04-15' }, 'Late'],
  ['promised for today', { promisedOn: '2026-04-16' }, 'This week and next'],
  ['fourteen days off', { promisedOn: '2026-04-30' }, 'This week and next'],
  ['fifteen days off', { promisedOn: '2026-05-01' }, 'Later'],
  ['no day', { promisedOn: null }, 'No day promised yet'],
  ['not acknowledged', { acknowledgedAt: null, promisedOn: null }, 'To acknowledge'],
  [
    'shipped, though its day has passed',
    { shippedAt: MOMENT, promisedOn: '2026-04-15' },
    'Away from you, papers or money open',
  ],
  ['all back', { stage: 'returned' as const, piecesBack: 10 }, 'Away from you, papers or money open'],
  ['some back of a late one', { piecesBack: 3, promisedOn: '2026-04-15' }, 'Late'],
])('%s', (_, part, says) => expect(groupOf(part)).toEqual([says]));

test('what presses stands first, and in a group the earliest day', () => {
  const groups = workGroups(
    [
      row({ id: 'later', promisedOn: '2026-06-01' }),
      row({ id: 'second', promisedOn: '2026-04-14' }),
      row({ id: 'first', promisedOn: '2026-04-10' }),
    ],
    clock,
  );
  expect(groups.map((group) => [group.says, group.rows.map((one) => one.id)])).toEqual([
    ['Late', ['first', 'second']],
    ['Later', ['later']],
  ]);
});

test.each([
  ['the shop asks', { asksMe: true }, { says: 'the shop asks', verb: 'Answer' }],
  ['not counted yet', { acknowledgedAt: null }, { says: '', verb: 'Count' }],
  ['an answer came', { answered: true }, { says: 'question answered', verb: 'Read' }],
  ['at work', {}, { says: '', verb: 'Send papers' }],
  ['shipped without papers', { shippedAt: MOMENT }, { says: 'certificate wanted', verb: 'Send papers' }],
  ['no invoice', { certificates: 1 }, { says: 'invoice wanted', verb: 'Send invoice' }],
  ['nothing open', { certificates: 1, invoices: 1 }, { says: '', verb: 'Open' }],
])('%s', (_, part, says) => expect(openOf(row(part))).toEqual(says));
