import type { Run } from './stories';

/** How one recorder writes a run. */
export interface Dialect {
  readonly name: string;
  readonly unit: 'F' | 'C';
  readonly delimiter: ',' | ';' | '\t' | '|' | ' ';
  readonly decimal: '.' | ',';
  /** As the reader should say it. */
  readonly time: string;
  readonly write: (run: Run) => Uint8Array;
}

/** A run that passes midnight shows day and month by the day that follows. */
const START = Date.UTC(2026, 2, 5, 23, 10, 0);

interface Row {
  readonly at: Date;
  readonly elapsed: number;
  readonly values: readonly string[];
}

interface Form {
  readonly unit: 'F' | 'C';
  readonly decimal: '.' | ',';
  readonly open: string;
}

const rowsOf = ({ seconds, channels }: Run, { unit, decimal, open }: Form): Row[] =>
  seconds.map((second, row) => ({
    at: new Date(START + second * 1000),
    elapsed: second,
    values: channels.map(({ values }) => {
      const value = values[row] ?? 'open';
      if (value === 'open') return open;
      return (unit === 'F' ? value : (value - 32) / 1.8).toFixed(1).replace('.', decimal);
    }),
  }));

const two = (number: number): string => String(number).padStart(2, '0');
const clock = (at: Date): string => at.toISOString().slice(11, 19);
const day = (at: Date): readonly [year: string, month: string, day: string] => [
  String(at.getUTCFullYear()),
  two(at.getUTCMonth() + 1),
  two(at.getUTCDate()),
];
const halfDayClock = (at: Date): string => {
  const hours = at.getUTCHours();
  return `${hours % 12 === 0 ? 12 : hours % 12}${clock(at).slice(2)} ${hours < 12 ? 'AM' : 'PM'}`;
};
const elapsedClock = (second: number): string =>
  [Math.floor(second / 3600), Math.floor(second / 60) % 60, second % 60].map(two).join(':');
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

const names = (run: Run): readonly string[] => run.channels.map(({ name }) => name);
const text = (lines: readonly string[], end = '\r\n'): Uint8Array =>
  new TextEncoder().encode(lines.join(end) + end);

/** Latin letters only, a byte each. */
const latin1 = (lines: readonly string[]): Uint8Array =>
  Uint8Array.from([...lines.join('\r\n')].map((letter) => letter.charCodeAt(0)));

function utf16(lines: readonly string[]): Uint8Array {
  const letters = [...`\uFEFF${lines.join('\r\n')}\r\n`];
  return Uint8Array.from(
    letters.flatMap((letter) => [letter.charCodeAt(0) & 0xff, letter.charCodeAt(0) >> 8]),
  );
}

export const DIALECTS: readonly Dialect[] = [
  {
    name: 'commas, month first, twelve hours',
    ...{ unit: 'F', delimiter: ',', decimal: '.', time: 'MM/DD/YYYY h:mm:ss A' },
    write: (run) =>
      text([
        'Recorder export',
        'Furnace,F-2,,',
        'Operator,"Marsh, D.",,',
        '',
        `Date/Time,${names(run)
          .map((name) => `${name} (°F)`)
          .join(',')},Status`,
        ...rowsOf(run, { unit: 'F', decimal: '.', open: 'OPEN' }).map(({ at, values }) => {
          const [year, month, date] = day(at);
          return `${month}/${date}/${year} ${halfDayClock(at)},${values.join(',')},RUN`;
        }),
        'End of record,,',
      ]),
  },
  {
    name: 'semicolons, decimal commas, latin letters',
    ...{ unit: 'C', delimiter: ';', decimal: ',', time: 'DD.MM.YYYY HH:mm:ss' },
    write: (run) =>
      latin1([
        'Gerät;Schreiber 4',
        'Ofen;F-2',
        'Prüfer;Hölzl',
        `Zeit;${names(run).join(';')};`,
        `TT.MM.JJJJ hh:mm:ss;${names(run)
          .map(() => '°C')
          .join(';')};`,
        ...rowsOf(run, { unit: 'C', decimal: ',', open: '-----' }).map(({ at, values }) => {
          const [year, month, date] = day(at);
          return `${date}.${month}.${year} ${clock(at)};${values.join(';')};`;
        }),
      ]),
  },
  {
    name: 'tabs, day and time apart',
    ...{ unit: 'F', delimiter: '\t', decimal: '.', time: 'YYYY/MM/DD HH:mm:ss' },
    write: (run) =>
      text(
        [
          '# unit: deg F',
          ['No.', 'Date', 'Time', ...names(run)].join('\t'),
          ...rowsOf(run, { unit: 'F', decimal: '.', open: '9999.9' }).map(({ at, values }, row) =>
            [row + 1, day(at).join('/'), clock(at), ...values].join('\t'),
          ),
        ],
        '\n',
      ),
  },
  {
    name: 'ISO times in quotes',
    ...{ unit: 'C', delimiter: ',', decimal: '.', time: 'YYYY-MM-DDTHH:mm:ss.SSSZ' },
    write: (run) =>
      text([
        ['timestamp', ...names(run).map((name) => `${name} [degC]`)].map((cell) => `"${cell}"`).join(','),
        ...rowsOf(run, { unit: 'C', decimal: '.', open: 'NaN' }).map(({ at, values }) =>
          [at.toISOString(), ...values].map((cell) => `"${cell}"`).join(','),
        ),
      ]),
  },
  {
    name: 'quoted decimal commas between commas',
    ...{ unit: 'C', delimiter: ',', decimal: ',', time: 'DD/MM/YYYY HH:mm:ss' },
    write: (run) =>
      text([
        `Date et heure,${names(run)
          .map((name) => `"${name} (°C)"`)
          .join(',')}`,
        ...rowsOf(run, { unit: 'C', decimal: ',', open: '****' }).map(({ at, values }) => {
          const [year, month, date] = day(at);
          return `${date}/${month}/${year} ${clock(at)},${values.map((value) => `"${value}"`).join(',')}`;
        }),
      ]),
  },
  {
    name: 'seconds since a stated start',
    ...{ unit: 'F', delimiter: ',', decimal: '.', time: 'elapsed s' },
    write: (run) =>
      text([
        'Start time: 2026-03-05 23:10:00',
        'Exported: 2026-04-01 09:00:00',
        `Elapsed (s),${names(run).join(',')}`,
        ...rowsOf(run, { unit: 'F', decimal: '.', open: '1E+30' }).map(({ elapsed, values }) =>
          [elapsed, ...values].join(','),
        ),
      ]),
  },
  {
    name: 'elapsed clock, bars, sixteen bits a letter',
    ...{ unit: 'F', delimiter: '|', decimal: '.', time: 'elapsed HH:mm:ss' },
    write: (run) =>
      utf16([
        'Run started 05-Mar-2026 23:10:00',
        ['Elapsed', ...names(run)].join(' | '),
        ['hh:mm:ss', ...names(run).map(() => '°F')].join(' | '),
        ...rowsOf(run, { unit: 'F', decimal: '.', open: 'B.OUT' }).map(({ elapsed, values }) =>
          [elapsedClock(elapsed), ...values].join(' | '),
        ),
      ]),
  },
  {
    name: 'set with spaces',
    ...{ unit: 'F', delimiter: ' ', decimal: '.', time: 'YYYY-MM-DD HH:mm:ss' },
    write: (run) =>
      text([
        'FURNACE 2   LOAD A',
        `Date        Time      ${names(run)
          .map((name) => name.padStart(8))
          .join('')}`,
        `                      ${names(run)
          .map(() => '    degF')
          .join('')}`,
        ...rowsOf(run, { unit: 'F', decimal: '.', open: '----' }).map(
          ({ at, values }) =>
            `${day(at).join('-')}  ${clock(at)}  ${values.map((value) => value.padStart(8)).join('')}`,
        ),
      ]),
  },
  {
    name: 'spreadsheet days',
    ...{ unit: 'C', delimiter: ';', decimal: ',', time: 'spreadsheet days' },
    write: (run) =>
      text([
        'sep=;',
        `Zeit;${names(run)
          .map((name) => `${name} °C`)
          .join(';')}`,
        ...rowsOf(run, { unit: 'C', decimal: ',', open: '#NV' }).map(({ at, values }) =>
          [(at.getTime() / 86_400_000 + 25_569).toFixed(8).replace('.', ','), ...values].join(';'),
        ),
      ]),
  },
  {
    name: 'milliseconds since 1970',
    ...{ unit: 'F', delimiter: ',', decimal: '.', time: 'ms since 1970' },
    write: (run) =>
      text(
        [
          ['unix_ms', ...names(run).map((name) => `${name}_F`)].join(','),
          ...rowsOf(run, { unit: 'F', decimal: '.', open: 'null' }).map(({ at, values }) =>
            [at.getTime(), ...values].join(','),
          ),
        ],
        '\n',
      ),
  },
  {
    name: 'month as a word, headings repeated',
    ...{ unit: 'F', delimiter: ',', decimal: '.', time: 'DD-MMM-YYYY HH:mm:ss' },
    write: (run) => {
      const heading = `Time,${names(run).join(',')},Event`;
      const rows = rowsOf(run, { unit: 'F', decimal: '.', open: 'Open' }).map(({ at, values }) => {
        const [year, , date] = day(at);
        const written = values.map((value) => (value === 'Open' ? value : `${value} F`));
        return `${date}-${MONTHS[at.getUTCMonth()] ?? ''}-${year} ${clock(at)},${written.join(',')},`;
      });
      const paged = rows.flatMap((row, at) => (at > 0 && at % 60 === 0 ? ['', heading, row] : [row]));
      return text(['Chart 26-0871', heading, ...paged, `Points,${rows.length}`, 'Checksum,7F3A']);
    },
  },
  {
    name: 'newest first',
    ...{ unit: 'F', delimiter: '\t', decimal: '.', time: 'DD/MM/YYYY HH:mm:ss' },
    write: (run) =>
      text([
        ['Time', ...names(run).map((name) => `${name}/°F`)].join('\t'),
        ...rowsOf(run, { unit: 'F', decimal: '.', open: 'Over' })
          .toReversed()
          .map(({ at, values }) => {
            const [year, month, date] = day(at);
            return [`${date}/${month}/${year} ${clock(at)}`, ...values].join('\t');
          }),
      ]),
  },
  {
    name: 'minutes since the start, stated in words',
    ...{ unit: 'C', delimiter: ';', decimal: '.', time: 'elapsed min' },
    write: (run) =>
      text([
        'Beginn;2026-03-05 23:10:00',
        `Laufzeit [min];${names(run)
          .map((name) => `${name} in °C`)
          .join(';')}`,
        ...rowsOf(run, { unit: 'C', decimal: '.', open: '3276.7' }).map(({ elapsed, values }) =>
          [(elapsed / 60).toFixed(4), ...values].join(';'),
        ),
      ]),
  },
  {
    name: 'time of the day, the day in the head',
    ...{ unit: 'F', delimiter: ',', decimal: '.', time: 'HH:mm:ss' },
    write: (run) =>
      text([
        'Date: 03/05/2026',
        `Time,${names(run)
          .map((name) => `${name} Deg F`)
          .join(',')}`,
        ...rowsOf(run, { unit: 'F', decimal: '.', open: '-9999' }).map(({ at, values }) =>
          [clock(at), ...values].join(','),
        ),
      ]),
  },
];

/** When the runs begin, seconds since 1970. */
export const START_S = START / 1000;
