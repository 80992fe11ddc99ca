import { z } from 'zod';

/** The columns of an import, by the name in the file's first line. `must` may not be left out. */
export const IMPORT_COLUMNS = [
  {
    key: 'part',
    head: 'part',
    must: true,
    example: 'FL-4418-03',
    says: 'Its drawing number, as it is here.',
  },
  { key: 'revision', head: 'revision', must: false, example: 'C', says: 'Empty is the current one.' },
  { key: 'heat', head: 'heat', must: true, example: '47-2210', says: "The mill's heat or melt number." },
  {
    key: 'pieces',
    head: 'pieces',
    must: true,
    example: '14',
    says: 'How many were made; a whole number without a comma.',
  },
  {
    key: 'serials',
    head: 'serials',
    must: false,
    example: '',
    says: 'Where each piece has its own: divided by semicolons, as S-1; S-2.',
  },
  {
    key: 'lot',
    head: 'lot',
    must: false,
    example: '',
    says: "A number of your own. Empty is the shop's next.",
  },
  {
    key: 'madeOn',
    head: 'made on',
    must: false,
    example: '2026-04-16',
    says: 'The day, year first. Empty is today.',
  },
  { key: 'note', head: 'note', must: false, example: '', says: 'For the shop.' },
] as const;
export type ImportKey = (typeof IMPORT_COLUMNS)[number]['key'];

export const MOST_ROWS = 1000;
const WHOLE = /^\d{1,7}$/;

/** One line of the file as it was read: text in every column. */
export const RawRow = z.object({
  part: z.string().max(200).default(''),
  revision: z.string().max(200).default(''),
  heat: z.string().max(200).default(''),
  pieces: z.string().max(200).default(''),
  serials: z.string().max(20_000).default(''),
  lot: z.string().max(200).default(''),
  madeOn: z.string().max(200).default(''),
  note: z.string().max(5000).default(''),
});
export type RawRow = z.output<typeof RawRow>;

const must = (name: string, longest: number) =>
  z.string().trim().min(1, `${name} is missing.`).max(longest, `${name} is longer than ${longest} letters.`);
const may = (name: string, longest: number) =>
  z.string().trim().max(longest, `${name} is longer than ${longest} letters.`);

/** What a line must be in itself. The browser shows it as the file is read, the server asks it again before it imports. */
export const ImportRow = z
  .object({
    part: must('The part', 60),
    revision: may('The revision', 12),
    heat: must('The heat', 60),
    pieces: may('Pieces', 12).refine(
      (text) => text === '' || (WHOLE.test(text) && Number(text) > 0 && Number(text) <= 1_000_000),
      'Pieces are a whole number from 1 to 1,000,000, without a comma.',
    ),
    serials: may('The list of serials', 20_000),
    lot: may('The lot number', 40),
    madeOn: may('The day', 10).refine(
      (text) => text === '' || z.iso.date().safeParse(text).success,
      'Write the day as 2026-04-16.',
    ),
    note: may('The note', 2000),
  })
  .superRefine((row, issues) => {
    const serials = serialsIn(row.serials);
    if (row.pieces === '' && serials.length === 0)
      issues.addIssue({
        code: 'custom',
        path: ['pieces'],
        message: 'Pieces are missing. Enter how many there are.',
      });
    if (WHOLE.test(row.pieces) && serials.length > 0 && serials.length !== Number(row.pieces)) {
      issues.addIssue({
        code: 'custom',
        path: ['serials'],
        message: `${row.pieces} pieces, but ${serials.length} serials. Each piece has one.`,
      });
    }
    const twice = firstTwice(serials);
    if (twice !== null)
      issues.addIssue({ code: 'custom', path: ['serials'], message: `Serial ${twice} is there twice.` });
  });
export type ImportRow = z.output<typeof ImportRow>;

/** A pasted or typed list: one a line, or divided by commas, semicolons or tabs. */
export const serialsIn = (text: string): string[] =>
  text
    .split(/[\n\r,;\t]+/)
    .map((one) => one.trim())
    .filter((one) => one !== '');

export function firstTwice(texts: readonly string[]): string | null {
  const seen = new Set<string>();
  for (const text of texts) {
    if (seen.has(text)) return text;
    seen.add(text);
  }
  return null;
}

export const piecesIn = (row: Pick<RawRow, 'pieces' | 'serials'>): number =>
  row.pieces.trim() === '' ? serialsIn(row.serials).length : Number(row.pieces);

/** The key of a column by its name in a file; spaces, case and underlines do not matter. */
export function columnNamed(head: string): ImportKey | null {
  const plain = (text: string) => text.toLowerCase().replace(/[\s_-]+/g, '');
  return IMPORT_COLUMNS.find((column) => plain(column.head) === plain(head))?.key ?? null;
}

/** What is wrong with a file as a whole, before any row is looked at. */
export function faultOfHeads(heads: readonly string[]): string | null {
  const known = heads.map(columnNamed);
  const missing = IMPORT_COLUMNS.filter(
    ({ key, must: needed }) =>
      needed && !known.includes(key) && !(key === 'pieces' && known.includes('serials')),
  );
  if (missing.length > 0)
    return `The first line must name the columns. Missing: ${missing.map(({ head }) => head).join(', ')}.`;
  const twice = firstTwice(known.filter((key) => key !== null));
  return twice === null ? null : `The column ${twice} is there twice.`;
}

/** A file to fill in: the names of the columns and one line to write over. */
export const importTemplate = (): string =>
  `${IMPORT_COLUMNS.map(({ head }) => head).join(',')}\r\n${IMPORT_COLUMNS.map(({ example }) => example).join(',')}\r\n`;
