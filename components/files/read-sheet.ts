import Papa from 'papaparse';

export type ReadSheet = { ok: true; heads: string[]; cells: string[][] } | { ok: false; message: string };

const LARGEST = 5_000_000;

/**
 * Reads a CSV as spreadsheets write them: comma, semicolon or tab, in UTF-8 or the code page of the country. The first
 * line is the names of columns; lines without anything in them are left out.
 */
export async function readSheet(file: File, mostRows: number): Promise<ReadSheet> {
  if (file.size === 0) return refuse(`${file.name} is empty: it has 0 bytes.`);
  if (file.size > LARGEST)
    return refuse(`${file.name} is larger than 5 MB. Import ${mostRows} rows at most at once.`);
  const text = decode(await file.arrayBuffer());
  if (text.includes('\u0000'))
    return refuse(`${file.name} is not a CSV file. In the spreadsheet, save it as CSV and choose that.`);
  const [heads = [], ...cells] = Papa.parse<string[]>(text, { skipEmptyLines: 'greedy' }).data;
  if (cells.length > mostRows)
    return refuse(
      `${file.name} has ${cells.length.toLocaleString('en-US')} rows; the most is ${mostRows.toLocaleString('en-US')}. Split it.`,
    );
  return { ok: true, heads: heads.map((head) => head.trim()), cells };
}

const refuse = (message: string): ReadSheet => ({ ok: false, message });

function decode(bytes: ArrayBuffer): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}
