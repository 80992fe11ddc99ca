import { expect, test } from 'vitest';

import { askedInFigures } from '@/lib/readings/asked-in-figures';

test.each([
  ['Solution temperature', '910 to 930', '°F', { solution: { set_f: 920, tolerance_f: 10 } }],
  ['Soak', '35 or more', 'min', { solution: { soak_min_minutes: 35 } }],
  ['Solution temperature', '488 to 498', '°C', { solution: { set_f: 919.4, tolerance_f: 9 } }],
  ['Quench delay', '10 or less', 's', { quench: { max_delay_seconds: 10 } }],
  ['Quench water temperature', '90 °F or less', '', { quench: { max_medium_temp_f: 90 } }],
  [
    'Age',
    '345 to 355 °F, 8 h',
    '',
    { age: { kind: 'artificial', set_f: 350, tolerance_f: 5, min_hours: 8 } },
  ],
  ['Natural age', '96 or more', 'h', { age: { kind: 'natural', min_hours: 96 } }],
  ['Hardness', 'HRB 63 or more', '', { hardness: { scale: 'HRB', min: 63 } }],
  ['Conductivity', '28.5 to 32.5', '% IACS', { conductivity_pct_iacs: { min: 28.5, max: 32.5 } }],
  ['Thickness', '0.0003 to 0.0005', 'in', { thickness: { unit: 'in', min: 0.0003, max: 0.0005 } }],
  ['Bake start', '4 or less after plating', 'h', { bake: { max_hours_after_plating: 4 } }],
  ['Bake', '375 ± 25 °F, 23 h', '', { bake: { set_f: 375, tolerance_f: 25, min_hours: 23 } }],
])('%s %s %s', (characteristic, limit, unit, asked) => {
  expect(askedInFigures({ characteristic, limit, unit })?.asked).toEqual(asked);
});

test.each([
  ['Salt spray', 'panel of this month'],
  ['Tempering temperature', 'on the chart'],
  ['Hardness', 'as the drawing says'],
])('%s, %s: a person reads it', (characteristic, limit) => {
  expect(askedInFigures({ characteristic, limit, unit: '' })).toBeNull();
});
