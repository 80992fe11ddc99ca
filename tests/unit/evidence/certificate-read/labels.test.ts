import { expect, test } from 'vitest';
import { labelAtStart, labelsIn } from '@/lib/evidence/certificate/read/find-labels';

const asked = (text: string): [string, string][] => {
  const labels = labelsIn(text);
  return labels.map(({ key, end }, index) => [key, text.slice(end, labels[index + 1]?.start).trim()]);
};

test.each([
  ['Certificate No.: C-1234', 'certificate_number', 'C-1234'],
  ['Zeugnis-Nr. / Certificate No.: 4711', 'certificate_number', '4711'],
  ['P.O. # 5001', 'purchase_order', '5001'],
  ['PO#4711', 'purchase_order', '4711'],
  ['Bestell-Nr. 4711', 'purchase_order', '4711'],
  ['Quench delay ........ 7 s', 'quench_delay', '7 s'],
  ['12. Lot', 'lot', ''],
  ['Soak Time at Temp', 'minutes', ''],
])('%s asks for %s', (text, key, value) => expect(asked(text)).toEqual([[key, value]]));

test('two labels of one line each have their value', () =>
  expect(asked('P.O. No. 5001  Date: 3/4/26')).toEqual([
    ['purchase_order', '5001'],
    ['date', '3/4/26'],
  ]));

test('a label knows its step, its unit and what else it asks for', () => {
  expect(labelAtStart('Solution temperature (°F)')).toMatchObject({
    key: 'temperature',
    step: 'solution',
    qualifier: '°F',
  });
  expect(labelAtStart('Part No. / Rev')).toMatchObject({ key: 'part_number', also: ['revision'] });
});

test.each(['PO-5001', '10:36 AM', 'CERTIFICATE OF CONFORMANCE', 'A fitting'])('%s is no label', (text) =>
  expect(labelAtStart(text)).toBeNull(),
);
