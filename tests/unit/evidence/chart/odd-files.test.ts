import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { readChart } from '@/lib/evidence/chart/read-chart';
import { UnreadableFile } from '@/lib/evidence/page';

const ASKED = { set: 920, tolerance: 10, unit: 'F', soakMinutes: 2 } as const;
const bytes = (text: string) => new TextEncoder().encode(text);
const codeOf = (file: Uint8Array) => {
  try {
    readChart(file, ASKED);
    return null;
  } catch (error) {
    if (error instanceof UnreadableFile) return error.code;
    throw error;
  }
};

describe('what is no chart is refused', () => {
  test.each([
    ['nothing', '', 'empty'],
    ['a letter', 'Dear sirs,\nthe furnace was hot.\nYours, D. Marsh\n', 'kind_not_supported'],
    ['a PDF', '%PDF-1.7\n1 0 obj', 'not_what_its_name_says'],
    ['a heading alone', 'Time,TC1,TC2\n', 'kind_not_supported'],
    ['zeros', '\0\0\0\0abc\0', 'not_what_its_name_says'],
  ])('%s', (_, text, code) => expect(codeOf(bytes(text))).toBe(code));

  test('any bytes end in a chart or a refusal', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 400 }), (file) => {
        codeOf(file);
      }),
    );
    fc.assert(
      fc.property(fc.array(fc.stringMatching(/^[0-9:;,.\- "TC/|\t]{0,40}$/)), (lines) => {
        codeOf(bytes(lines.join('\n')));
      }),
    );
  });
});

/** Five minutes in the band, a row each thirty seconds from 08:00. */
const table = (heading: string, row: (clock: string, second: number) => string) =>
  bytes(
    [
      heading,
      ...Array.from({ length: 14 }, (_, at) => {
        const second = at * 30;
        const clock = `08:${String(Math.floor(second / 60)).padStart(2, '0')}:${String(second % 60).padStart(2, '0')}`;
        return row(clock, second);
      }),
    ].join('\n'),
  );
const degrees = (second: number) => (second < 60 || second > 360 ? 880 : 920);

describe('odd ways of writing', () => {
  test.each([
    [
      'AM in a column of its own',
      table('Date,Time,AM/PM,TC1', (clock, s) => `3/25/26,${clock},AM,${degrees(s)}.0`),
    ],
    [
      'points in the clock',
      table('Data;Ora;T1', (clock, s) => `25/03/2026;${clock.replaceAll(':', '.')};${degrees(s)},0`),
    ],
    [
      'no separators',
      table('DATE,TIME,TC1', (clock, s) => `20260325,${clock.replaceAll(':', '')},${degrees(s)}`),
    ],
    [
      'breaks in headings',
      table('"Time","TC1\n(°F)"', (clock, s) => `"25 Mar 2026 ${clock}","${degrees(s)}"`),
    ],
    ['no heading', table('', (clock, s) => `2026-03-25 ${clock}\t${degrees(s)}.5`)],
    ['thousands', table('Time;TC1;Blower (rpm)', (clock, s) => `2026-03-25 ${clock};${degrees(s)};1.550,3`)],
    [
      'old line ends',
      bytes(
        new TextDecoder()
          .decode(table('Time,1', (clock, s) => `2026-03-25T${clock}Z,${degrees(s)}`))
          .replaceAll('\n', '\r'),
      ),
    ],
    [
      'a row for each reading',
      bytes(
        new TextDecoder()
          .decode(
            table(
              '',
              (clock, s) =>
                `2026-03-25 ${clock};TC1;${degrees(s)};F\n2026-03-25 ${clock};TC2;${degrees(s) + 2};F`,
            ),
          )
          .replace('\n', 'Time;Channel;Value;Unit\n'),
      ),
    ],
    [
      'the number of the load in each row',
      table('Load No;Time;TC1 °F', (clock, s) => `12;2026-03-25 ${clock};${degrees(s)}`),
    ],
    ['units in cells', table('Time,TC1', (clock, s) => `2026-03-25 ${clock},${degrees(s)} °F`)],
  ])('%s', (_, file) => {
    const read = readChart(file, ASKED);
    expect([read.soak_start, read.soak_end, read.understood.rows]).toEqual([
      '2026-03-25T08:01:00',
      '2026-03-25T08:06:30',
      14,
    ]);
  });

  test('a plunge of which the transfer is not to be seen leaves the delay open', () => {
    const rows = Array.from(
      { length: 200 },
      (_, s) => `${s},${s < 120 ? 920 + (s % 2) : Math.max(80, 920 - (s - 120) * 150)}`,
    );
    const read = readChart(bytes(['Time (s),TC1', ...rows].join('\n')), {
      ...ASKED,
      soakMinutes: 1,
      maxQuenchDelayS: 10,
    });
    expect([read.quench_delay_s, read.verdict]).toEqual([null, 'review']);
  });

  test('a thermocouple without readings inside the soak makes it a review', () => {
    const rows = (empty: (s: number) => boolean) =>
      bytes(
        [
          'Time (s),TC1,TC2',
          ...Array.from({ length: 400 }, (_, s) => `${s},920.5,${empty(s) ? '' : 919}`),
        ].join('\n'),
      );
    const read = readChart(
      rows((s) => s > 100 && s < 160),
      ASKED,
    );
    expect([read.verdict, read.flags.map(({ code, channel }) => [code, channel])]).toEqual([
      'review',
      [['gap', 'TC2']],
    ]);
    expect(
      readChart(
        rows((s) => s > 250),
        ASKED,
      ).verdict,
    ).toBe('review');
    // Written in every other row, it is all there.
    expect(
      readChart(
        rows((s) => s % 2 === 1),
        ASKED,
      ),
    ).toMatchObject({ verdict: 'pass', flags: [] });
  });

  test('a long file that counts from zero is read to its end', () => {
    for (const count of [2000, 5000, 8000, 20_000]) {
      const rows = Array.from({ length: count }, (_, s) => `${s * 2},${900 + (s % 7)}.5,${905 + (s % 5)}.5`);
      expect(readChart(bytes(['Time (s),TC1,TC2', ...rows].join('\n')), ASKED).understood.rows).toBe(count);
    }
  });

  test('rows of one minute without seconds are spread over it', () => {
    const read = readChart(
      table('Time,TC1', (clock, s) => `2026-03-25 ${clock.slice(0, 5)},${degrees(s)}`),
      ASKED,
    );
    expect([read.soak_start, read.soak_end]).toEqual(['2026-03-25T08:01:00', '2026-03-25T08:06:30']);
  });

  test('the day is told by the rows after the twelfth', () => {
    const rows = Array.from(
      { length: 30 },
      (_, at) => `${String(at + 1).padStart(2, '0')}/04/2026 08:00:00,${920 + (at % 3)}`,
    );
    const read = readChart(bytes(['Time,TC1', ...rows].join('\n')), ASKED);
    expect(read.understood.time).toBe('DD/MM/YYYY HH:mm:ss');
    expect(read.soak_start).toBe('2026-04-01T08:00:00');
    expect(read.understood.notes.join()).not.toContain('exchanged');
  });

  test('day and month that could be exchanged are noted', () => {
    const file = table('Time,TC1', (clock, s) => `03/04/2026 ${clock},${degrees(s)}`);
    const read = readChart(file, ASKED);
    expect(read.understood.notes.join()).toContain('exchanged');
    expect(readChart(file, ASKED, { dateOrder: 'DMY' }).soak_start).toBe('2026-04-03T08:01:00');
  });

  test('a door that opens and a load that is in the water say the delay', () => {
    const file = table('Time,TC1,TC2', (clock, s) =>
      s === 360
        ? `${clock},${degrees(s)},919\n08:06:05,DOOR OPEN,\n08:06:12,QUENCH,`
        : `${clock},${degrees(s)},${degrees(s) - 1}`,
    );
    expect(readChart(file, { ...ASKED, maxQuenchDelayS: 10 }).quench_delay_s).toBe(7);
  });
});

describe('corrections win over guesses', () => {
  const file = table('Time;TC1;TC2', (clock, s) => `2026-03-25 ${clock};${degrees(s)};${degrees(s) - 100}`);

  test('a channel left out, renamed, or given another role', () => {
    expect(readChart(file, ASKED).verdict).toBe('fail');
    const corrected = readChart(file, ASKED, { channels: [{ column: 2, excluded: true, name: 'Spare' }] });
    expect(corrected.verdict).toBe('pass');
    expect(corrected.understood.channels[1]).toEqual({
      column: 2,
      name: 'Spare',
      role: 'load',
      excluded: 'by_hand',
    });
    expect(readChart(file, ASKED, { channels: [{ column: 2, role: 'other' }] }).soak_minutes).toBe(5.5);
  });

  test('the unit', () => {
    expect(readChart(file, ASKED, { unit: 'C' }).max_temperature).toBe(1688);
  });

  test('what elapsed time counts, and from when', () => {
    const counted = bytes(
      ['t;TC1', ...Array.from({ length: 9 }, (_, at) => `${at};${at < 2 ? 800 : 920}`)].join('\n'),
    );
    expect(readChart(counted, ASKED).verdict).toBe('fail');
    const read = readChart(counted, ASKED, { elapsedUnit: 'min', startedAt: '2026-03-25T08:00:00' });
    expect([read.verdict, read.soak_start, read.soak_minutes]).toEqual(['pass', '2026-03-25T08:02:00', 6]);
  });
});
