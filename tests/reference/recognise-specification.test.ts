import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import {
  findSpecifications,
  recogniseSpecification,
  writeSpecification,
  type SpecificationBody,
} from '@/lib/trade/lineage/recognise-specification';

describe('a specification as people write it', () => {
  test.each([
    ['AMS2770R', 'AMS', 'AMS2770', 'R', ''],
    ['AMS 2770 Rev R', 'AMS', 'AMS2770', 'R', ''],
    ['AMS 2770, Revision R', 'AMS', 'AMS2770', 'R', ''],
    ['AMS-2770 rev. r', 'AMS', 'AMS2770', 'R', ''],
    ['SAE AMS2770 R', 'AMS', 'AMS2770', 'R', ''],
    ['ams2770r', 'AMS', 'AMS2770', 'R', ''],
    ['AMS2770 (Rev R)', 'AMS', 'AMS2770', 'R', ''],
    ['AMS2770', 'AMS', 'AMS2770', null, ''],
    ['AMS 2770 solution and age', 'AMS', 'AMS2770', null, 'solution and age'],
    ['AMS2759/5D', 'AMS', 'AMS2759/5', 'D', ''],
    ['AMS 2759/11', 'AMS', 'AMS2759/11', null, ''],
    ['AMS-H-6088C', 'AMS', 'AMS-H-6088', 'C', ''],
    ['AMS-QQ-P-416C Type II', 'AMS', 'AMS-QQ-P-416', 'C', 'Type II'],
    ['AMS QQ-A-250/4', 'AMS', 'AMS-QQ-A-250/4', null, ''],
    ['AMS-STD-2154', 'AMS', 'AMS-STD-2154', null, ''],
    ['ASTM B633-19', 'ASTM', 'ASTM B633', '19', ''],
    ['ASTM B 633 – 19 Type II SC 2', 'ASTM', 'ASTM B633', '19', 'Type II SC 2'],
    ['ASTM B850-98(2009)', 'ASTM', 'ASTM B850', '98(2009)', ''],
    ['ASTM B850-98R2009', 'ASTM', 'ASTM B850', '98(2009)', ''],
    ['ASTM E1444/E1444M-22a', 'ASTM', 'ASTM E1444', '22a', ''],
    ['ASTM E1444/E1444M-22A', 'ASTM', 'ASTM E1444', '22a', ''],
    ['ASTM A967/A967M-17 Nitric 2', 'ASTM', 'ASTM A967', '17', 'Nitric 2'],
    ['ASTM B117-19e1', 'ASTM', 'ASTM B117', '19e1', ''],
    ['ASTM E1417', 'ASTM', 'ASTM E1417', null, ''],
    ['MIL-DTL-5541F', 'MIL', 'MIL-DTL-5541', 'F', ''],
    ['MIL DTL 5541F, Type II, Class 3', 'MIL', 'MIL-DTL-5541', 'F', 'Type II, Class 3'],
    ['MIL‐DTL‐5541 F Type I', 'MIL', 'MIL-DTL-5541', 'F', 'Type I'],
    ['MIL-DTL-5541 Notice 2', 'MIL', 'MIL-DTL-5541', null, 'Notice 2'],
    ['MIL-A-8625F with Amendment 1', 'MIL', 'MIL-A-8625', 'F', 'with Amendment 1'],
    ['MIL-STD-105E', 'MIL', 'MIL-STD-105', 'E', ''],
    ['MIL-HDBK-5J', 'MIL', 'MIL-HDBK-5', 'J', ''],
    ['DOD-P-16232F', 'DOD', 'DOD-P-16232', 'F', ''],
    ['QQ-P-416F Type II Class 2', 'FED', 'QQ-P-416', 'F', 'Type II Class 2'],
    ['QQ-A-250/4E', 'FED', 'QQ-A-250/4', 'E', ''],
    ['WW-T-700/6', 'FED', 'WW-T-700/6', null, ''],
    ['AN-A-12', 'AN', 'AN-A-12', null, ''],
    ['AN-QQ-S-685', 'AN', 'AN-QQ-S-685', null, ''],
    ['NAS410 Rev 4', 'NAS', 'NAS 410', '4', ''],
    ['NAS 4160', 'NAS', 'NAS 4160', null, ''],
    ['EN 4179:2017', 'EN', 'EN 4179', '2017', ''],
    ['ISO 2859-1:1999', 'ISO', 'ISO 2859-1', '1999', ''],
    ['ANSI/ASQ Z1.4-2008', 'ANSI', 'ANSI/ASQ Z1.4', '2008', ''],
    ['ANSI/ASQC Z1.4-1993', 'ANSI', 'ANSI/ASQ Z1.4', '1993', ''],
    ['AMS 2770/2771/2772', 'AMS', 'AMS2770', null, '2771/2772'],
    ['ANSI/NCSL Z540-1', 'ANSI', 'ANSI/NCSL Z540-1', null, ''],
    ['DTD36B', 'DTD', 'DTD 36', 'B', ''],
    ['DTD 390', 'DTD', 'DTD 390', null, ''],
    ['BS 2S28', 'BS', 'BS S28', '2', ''],
    ['BS L72', 'BS', 'BS L72', null, ''],
  ] as const)('%s', (...row) => {
    const [text, body, number, revision, rest] = row;
    expect(recogniseSpecification(text)).toEqual({ body, number, revision, rest });
  });

  test.each([
    '',
    'cadmium plate',
    'AMS',
    'AMS 27',
    'AMS27701',
    'an A 12 bolt',
    'B633-19',
    'per AMS2770',
    'MIL-5541',
    'XAMS2770',
  ])('"%s" does not begin with one', (text) => {
    expect(recogniseSpecification(text)).toBeNull();
  });

  test('the trap of the issue that stands before the number: BS 2S28 is issue 2 of S28, DTD36B issue B of DTD 36', () => {
    expect(recogniseSpecification('BS 2S28')).toMatchObject({ number: 'BS S28', revision: '2' });
    expect(recogniseSpecification('BS S28')).toMatchObject({ number: 'BS S28', revision: null });
    expect(recogniseSpecification('DTD36B')).toMatchObject({ number: 'DTD 36', revision: 'B' });
  });
});

describe('specifications in a longer text', () => {
  test('per MIL-DTL-5541F Class 3; inspect to ASTM E1417', () => {
    const text = 'per MIL-DTL-5541F Class 3; inspect to ASTM E1417';
    const found = findSpecifications(text);
    expect(found.map(({ number, revision, rest }) => [number, revision, rest])).toEqual([
      ['MIL-DTL-5541', 'F', 'Class 3'],
      ['ASTM E1417', null, ''],
    ]);
    expect(found.map(({ at, length }) => text.slice(at, at + length))).toEqual([
      'MIL-DTL-5541F',
      'ASTM E1417',
    ]);
  });

  test('several lines, each with its own rest', () => {
    const found = findSpecifications('We certify AMS2770R\nand QQ-P-416F Type II, Class 2 (AMS-QQ-P-416C)');
    expect(found.map(({ number, rest }) => [number, rest])).toEqual([
      ['AMS2770', ''],
      ['QQ-P-416', 'Type II, Class 2 ('],
      ['AMS-QQ-P-416', ')'],
    ]);
  });

  test('no text makes it fail, and what is found stands where it is said to stand', () => {
    const words = fc.constantFrom(
      'AMS',
      'MIL-',
      'QQ-P-',
      'ASTM B',
      '416',
      '2770',
      'F',
      ' ',
      '-',
      'Rev ',
      '\n',
      '(',
      'x',
    );
    const text = fc.array(words, { maxLength: 30 }).map((parts) => parts.join(''));
    fc.assert(
      fc.property(fc.oneof(text, fc.string()), (asked) =>
        findSpecifications(asked).every(({ at, length, number }) => {
          const there = recogniseSpecification(asked.slice(at, at + length));
          return at >= 0 && at + length <= asked.length && there?.number === number;
        }),
      ),
    );
  });
});

describe('round trips', () => {
  const digits = (min: number, max: number) => fc.integer({ min, max }).map(String);
  const letter = fc.constantFrom(...'ABCDEFGHJKLMNPQRSTUVWY');
  const issue = fc.option(letter, { nil: null });
  const year = fc.option(fc.constantFrom('19', '22a', '98(2009)', '17e1', '2008'), { nil: null });
  const colonYear = fc.option(digits(1980, 2026), { nil: null });
  const rest = fc.constantFrom('', 'Type II Class 2', 'Class 3', 'Amendment 1', 'Grade B');
  const of = (body: SpecificationBody, number: fc.Arbitrary<string>, revision: fc.Arbitrary<string | null>) =>
    fc.record({ body: fc.constant(body), number, revision, rest });
  const reference = fc.oneof(
    of(
      'AMS',
      digits(1000, 9999).map((one) => `AMS${one}`),
      issue,
    ),
    of(
      'AMS',
      fc.tuple(digits(1000, 9999), digits(1, 99)).map(([one, slash]) => `AMS${one}/${slash}`),
      issue,
    ),
    of(
      'AMS',
      fc.tuple(letter, digits(1, 9999)).map(([one, number]) => `AMS-QQ-${one}-${number}`),
      issue,
    ),
    of(
      'AMS',
      fc.tuple(letter, digits(1000, 99_999)).map(([one, number]) => `AMS-${one}-${number}`),
      issue,
    ),
    of(
      'MIL',
      fc
        .tuple(fc.constantFrom('DTL', 'PRF', 'STD', 'HDBK'), digits(1, 99_999))
        .map(([kind, number]) => `MIL-${kind}-${number}`),
      issue,
    ),
    of(
      'MIL',
      fc.tuple(letter, digits(100, 99_999)).map(([kind, number]) => `MIL-${kind}-${number}`),
      issue,
    ),
    of(
      'FED',
      fc.tuple(fc.constantFrom('QQ', 'TT', 'WW'), letter, digits(1, 9999)).map((parts) => parts.join('-')),
      issue,
    ),
    of(
      'NAS',
      digits(100, 99_999).map((one) => `NAS ${one}`),
      fc.option(digits(1, 9), { nil: null }),
    ),
    of(
      'ASTM',
      fc.tuple(fc.constantFrom(...'ABCDEFG'), digits(1, 9999)).map(([one, number]) => `ASTM ${one}${number}`),
      year,
    ),
    of(
      'ISO',
      digits(100, 99_999).map((one) => `ISO ${one}`),
      colonYear,
    ),
    of(
      'EN',
      digits(100, 99_999).map((one) => `EN ${one}`),
      colonYear,
    ),
    of(
      'DTD',
      digits(1, 9999).map((one) => `DTD ${one}`),
      issue,
    ),
    of(
      'BS',
      fc.tuple(fc.constantFrom('L', 'S', 'T'), digits(1, 999)).map(([one, number]) => `BS ${one}${number}`),
      fc.option(digits(2, 9), { nil: null }),
    ),
  );

  test('what is written one way is read back as the same', () => {
    fc.assert(
      fc.property(reference, (asked) => {
        expect(recogniseSpecification(writeSpecification(asked))).toEqual(asked);
      }),
      { numRuns: 1000 },
    );
  });

  test('spaces for hyphens, small letters and dashes of print change nothing', () => {
    const inHyphens = reference.filter(({ body }) => body === 'MIL' || body === 'FED');
    fc.assert(
      fc.property(inHyphens, fc.constantFrom(' ', '–', '-'), fc.boolean(), (asked, mark, small) => {
        const written = writeSpecification({ ...asked, rest: '' }).replaceAll('-', mark);
        expect(recogniseSpecification(small ? written.toLowerCase() : written)).toEqual({
          ...asked,
          rest: '',
        });
      }),
    );
  });
});
