import { expect, test } from 'vitest';

import { reliefRefusal, reliefReply } from '@/components/reference/bake-words';
import { relief } from '@/lib/trade/steel/relief';
import { BAKE_HOURS_BY_STRENGTH } from '@/lib/trade/tables/bake-hours-by-strength';
import { EMBRITTLEMENT_RULES } from '@/lib/trade/tables/embrittlement-rules';
import { EXPOSURE_LIMITS } from '@/lib/trade/tables/exposure-limits';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';

const TABLES = {
  rules: EMBRITTLEMENT_RULES,
  bakeHours: BAKE_HOURS_BY_STRENGTH,
  conversion: HARDNESS_STEEL_HRC,
  exposure: EXPOSURE_LIMITS,
};

test('says hours, temperature and start of the bake in the units chosen', () => {
  const found = relief(
    TABLES,
    'embrittlement_relief',
    { specification: 'QQ-P-416', revision: 'F' },
    { hrc: 42 },
  );
  if (!found.ok) throw new Error(found.reason);
  expect(reliefReply(found, 'Bake', 'inch')).toMatchObject({ says: 'Bake: 23 h at 350 to 400 °F' });
  expect(reliefReply(found, 'Bake', 'metric').says).toBe('Bake: 23 h at 177 to 204 °C');
  expect(reliefReply(found, 'Bake', 'inch').rest).toContain('started within 4 h');
});

test('a revision that is not named is asked for', () => {
  const found = relief(TABLES, 'embrittlement_relief', { specification: 'QQ-P-416' }, { hrc: 42 });
  expect(!found.ok && reliefRefusal(found.reason)).toMatch(/Name the revision/);
});
