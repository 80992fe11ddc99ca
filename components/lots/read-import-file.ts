import Papa from 'papaparse';

import { columnNamed, faultOfHeads, MOST_ROWS, RawRow } from '@/lib/lots/import-row';

export type ReadFile = { ok: true; rows: RawRow[]; ignored: string[] } | { ok: false; message: string };

const LARGEST = 5_000_000;

/** Reads a CSV as spreadsheets write them: comma, semicolon or tab, in UTF-8 or the code page of the country. */
export async function readImportFile(file: File): Promise<ReadFile> {
  if (file.size === 0) return refuse(`${file.name} is empty: it has 0 bytes.`);
  if (file.size > LARGEST)
    return refuse(`${file.name} is larger than 5 MB. Import ${MOST_ROWS} rows at most at once.`);
  const text = decode(await file.arrayBuffer());
  if (text.includes('\u0000'))
    return refuse(`${file.name} is not a CSV file. In the spreadsheet, save it as CSV and choose that.`);

  const { data, meta } = Papa.parse<Record<string, string>>(text, {
    header: true,
    skipEmptyLines: 'greedy',
    transformHeader: (head) => head.trim(),
  });
  const heads = meta.fields ?? [];
  const fault = faultOfHeads(heads);
  if (fault !== null) return refuse(`${file.name}: ${fault}`);
  if (data.length === 0) return refuse(`${file.name} has the names of the columns and no rows under them.`);
  if (data.length > MOST_ROWS)
    return refuse(
      `${file.name} has ${data.length.toLocaleString('en-US')} rows; the most is ${MOST_ROWS.toLocaleString('en-US')}. Split it.`,
    );
  return {
    ok: true,
    rows: data.map(asRow),
    ignored: heads.filter((head) => head !== '' && columnNamed(head) === null),
  };
}

const refuse = (message: string): ReadFile => ({ ok: false, message });

function asRow(cells: Record<string, string>): RawRow {
  const known = Object.entries(cells).flatMap(([head, text]) => {
    const key = columnNamed(head);
    return key === null || typeof text !== 'string'
      ? []
      : [[key, text.slice(0, key === 'serials' ? 20_000 : 200)]];
  });
  return RawRow.parse(Object.fromEntries(known));
}

function decode(bytes: ArrayBuffer): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}
