import { unzipSync } from 'fflate';

/** Unpacks an archive with a reader that has nothing to do with what wrote it. */
export function unzip(archive: Buffer): Map<string, Buffer> {
  return new Map(Object.entries(unzipSync(archive)).map(([path, content]) => [path, Buffer.from(content)]));
}
