import { createHash } from 'node:crypto';
import { buffer } from 'node:stream/consumers';
import type { Readable } from 'node:stream';

import archiver from 'archiver';

import type { DossierContent, DossierFile } from './content';

interface Archive {
  content: DossierContent;
  document: Buffer;
  statedAt: Date;
  open(file: DossierFile): Promise<Readable>;
}

/** Somebody has been at the storage. */
export class ChangedOriginal extends Error {
  constructor(name: string) {
    super(
      `The original ${name} no longer has its hash: the bytes in storage are not those that were kept. No dossier was made.`,
    );
    this.name = 'ChangedOriginal';
  }
}

/**
 * One ZIP: the document, every original unaltered, the data as JSON, and two lists of hashes. `SHA256SUMS` is in the
 * form that `sha256sum -c` reads, so that anybody can check it in twenty years without us; `manifest.json` says what
 * each file is. Entries carry the stated time, so that the same dossier makes the same bytes.
 *
 * @throws ChangedOriginal where an original no longer has the hash it was kept under: such an archive must not be made.
 */
export async function makeArchive({ content, document, statedAt, open }: Archive): Promise<Buffer> {
  const zip = archiver('zip', { zlib: { level: 6 } });
  const bytes = buffer(zip);
  const sums: { path: string; sha256: string; size: number; what: string }[] = [];
  const add = (path: string, content: Buffer, what: string) => {
    sums.push({ path, sha256: sha256Of(content), size: content.length, what });
    zip.append(content, { name: path, date: statedAt });
  };

  add('dossier.pdf', document, 'The dossier as one document');
  add(
    'dossier.json',
    Buffer.from(`${JSON.stringify(withoutKeys(content), null, 2)}\n`),
    'All that the dossier says, as data',
  );
  const taken = new Set<string>();
  for (const file of content.files) {
    const original = unchanged(file, await buffer(await open(file)));
    add(
      uniquePath(file, taken),
      original,
      `${file.purpose.replaceAll('_', ' ')}${file.batchNumber ? ` of ${file.batchNumber}` : ''}, as received`,
    );
  }
  const manifest = Buffer.from(
    `${JSON.stringify({ lot: content.lot.number, shop: content.shop.name, stated: statedAt.toISOString(), auditHead: content.auditHead, files: sums }, null, 2)}\n`,
  );
  add('manifest.json', manifest, 'What each file is, with its hash');
  zip.append(sums.map(({ path, sha256 }) => `${sha256}  ${path}\n`).join(''), {
    name: 'SHA256SUMS',
    date: statedAt,
  });
  await zip.finalize();
  return bytes;
}

/** @throws ChangedOriginal */
export function unchanged(file: Pick<DossierFile, 'name' | 'sha256'>, original: Buffer): Buffer {
  if (sha256Of(original) !== file.sha256) throw new ChangedOriginal(file.name);
  return original;
}

/** Where bytes lie in our storage is nobody's business outside. */
const withoutKeys = (content: DossierContent) => ({
  ...content,
  files: content.files.map(({ storageKey: _, ...file }) => file),
});

/** A path that every unpacking program can make: the file's own name, freed of what paths and consoles read as commands. */
function uniquePath(file: DossierFile, taken: Set<string>): string {
  const safe =
    file.name
      .normalize('NFC')
      .replace(/[^\p{L}\p{N}. _()-]/gu, '_')
      .replace(/^\.+/, '')
      .slice(-100) || 'file';
  const folder = file.batchNumber === null ? 'originals' : `originals/${file.batchNumber}`;
  let path = `${folder}/${safe}`;
  if (taken.has(path.toLowerCase())) path = `${folder}/${file.id.slice(-8)} ${safe}`;
  taken.add(path.toLowerCase());
  return path;
}

const sha256Of = (content: Buffer): string => createHash('sha256').update(content).digest('hex');
