import { expect, test } from 'vitest';

import { listWords, missingWords } from '@/components/stock/missing-words';

type Line = Parameters<typeof missingWords>[0];
const at = { batchId: 'b1', processor: 'Galena Thermal' };
const missing = (reason: Line['missing'][number]['reason'], pieces: number) => ({
  reason,
  pieces,
  detail: [],
});
const line = (of: Line['missing'], beside: Partial<Line> = {}): Line => ({
  missing: of,
  unpaid: [],
  holds: [],
  ...beside,
});

test('what stops comes before what warns, and that before what is noted', () => {
  const words = missingWords(
    line([missing('still_away', 1), missing('not_proved', 2), missing('on_hold', 3)]),
    at,
  );
  expect(words.map((one) => one.level)).toEqual(['stop', 'warn', 'note']);
});

test('where nothing is back, "still away" would only say it again', () => {
  const words = missingWords(line([missing('still_away', 4), missing('nothing_back', 4)]), at);
  expect(words.map((one) => one.sentence)).toEqual(['Nothing of it is back.']);
});

test('one is, two are', () => {
  expect(missingWords(line([missing('not_proved', 1)]), at)[0]).toMatchObject({
    sentence: '1 is not proved.',
    rest: 'No signed certificate speaks for it.',
  });
  expect(missingWords(line([missing('not_proved', 2)]), at)[0]).toMatchObject({
    sentence: '2 are not proved.',
    rest: 'No signed certificate speaks for them.',
  });
});

test('each hold and each unpaid batch is a way out of its own', () => {
  const [hold, money] = missingWords(
    line([missing('on_hold', 1), missing('not_paid', 9)], {
      holds: [{ id: 'n1', number: 'NC-0037' }],
      unpaid: [
        { id: 'b1', number: 'B-0404' },
        { id: 'b0', number: 'B-0401' },
      ],
    }),
    at,
  );
  expect(hold?.waysOut).toEqual([{ says: 'Decide on NC-0037', href: '/nonconformances/n1' }]);
  expect(money?.rest).toContain('B-0404 and B-0401 must be paid');
  expect(money?.waysOut.map((way) => way.href)).toEqual(['/batches/b1#invoices', '/batches/b0#invoices']);
});

test.each([
  [[], ''],
  [['B-0404'], 'B-0404'],
  [['B-0404', 'B-0401'], 'B-0404 and B-0401'],
  [['B-0404', 'B-0401', 'B-0399'], 'B-0404, B-0401 and B-0399'],
])('%j in words', (words, says) => expect(listWords(words)).toBe(says));
