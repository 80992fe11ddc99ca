import { readSheet } from '@/components/files/read-sheet';
import { columnNamed, faultOfHeads, MOST_ROWS, RawRow } from '@/lib/lots/import-row';

export type ReadFile = { ok: true; rows: RawRow[]; ignored: string[] } | { ok: false; message: string };

/** The lots of a file, row by row as they stand there. */
export async function readImportFile(file: File): Promise<ReadFile> {
  const read = await readSheet(file, MOST_ROWS);
  if (!read.ok) return read;
  const { heads, cells } = read;
  const fault = faultOfHeads(heads);
  if (fault !== null) return refuse(`${file.name}: ${fault}`);
  if (cells.length === 0) return refuse(`${file.name} has the names of the columns and no rows under them.`);
  return {
    ok: true,
    rows: cells.map((line) => asRow(heads, line)),
    ignored: heads.filter((head) => head !== '' && columnNamed(head) === null),
  };
}

const refuse = (message: string): ReadFile => ({ ok: false, message });

function asRow(heads: readonly string[], line: readonly string[]): RawRow {
  const known = heads.flatMap((head, at) => {
    const key = columnNamed(head);
    const text = line[at];
    return key === null || text === undefined ? [] : [[key, text.slice(0, key === 'serials' ? 20_000 : 200)]];
  });
  return RawRow.parse(Object.fromEntries(known));
}
