import { expect, test } from 'vitest';

import { countWaiting } from '@/lib/tideline/what-waits';

test('what waits is counted in the section it leads to, holds under certificates', () =>
  expect(
    countWaiting([
      { href: '/batches/b1#messages' },
      { href: '/batches/b2/release' },
      { href: '/certificates/c1' },
      { href: '/nonconformances/n1' },
      { href: '/invoices/i1' },
    ]),
  ).toEqual({ total: 5, sections: { batches: 2, certificates: 2, invoices: 1 } }));

test('nothing waits', () =>
  expect(countWaiting([])).toEqual({ total: 0, sections: { batches: 0, certificates: 0, invoices: 0 } }));
