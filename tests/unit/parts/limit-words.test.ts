import { expect, test } from 'vitest';

import { limitWords } from '@/lib/parts/limit-words';

test.each([
  ['10 or less', 's', '10 s or less'],
  ['84 or more', 'HRB', '84 HRB or more'],
  ['4 or less after plating', 'h', '4 h or less after plating'],
  ['63 to 83', 'HRB', '63 to 83 HRB'],
  ['HRB 84 or more', '', 'HRB 84 or more'],
  ['as ordered', '', 'as ordered'],
  ['none or less', 'in', 'none or less in'],
  ['', '', ''],
])('%s in %s reads %s', (limit, unit, says) => expect(limitWords({ limit, unit })).toBe(says));
