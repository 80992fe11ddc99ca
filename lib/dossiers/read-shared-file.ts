import { eq } from 'drizzle-orm';
import { Readable } from 'node:stream';

import { files } from '@/db/schema/files';
import type { Outside } from '@/lib/api/endpoint';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { fileHeaders } from '@/lib/files/read-file-content';
import { getObject } from '@/lib/storage/object-store';

import { throughDossierLink } from './dossier-links';
import { openDossierLink } from './queries';

interface Input {
  token: string;
  fileId: string;
  inline: '0' | '1';
}

/** Opens a file that the shared dossier names, and no other of the shop. */
export async function openSharedFile(outside: Outside, { token, fileId, inline }: Input): Promise<Response> {
  const file = await outside.inTenant(async (ctx) => {
    authorize(ctx, 'public.use');
    const { evidence, made } = await openDossierLink(ctx, { token });
    const named = [...evidence.files.map((one) => one.id), made?.documentFileId, made?.archiveFileId];
    if (!named.includes(fileId)) throw notFound('file');
    return throughDossierLink(
      ctx,
      token,
      async (inner) => (await inner.tx.select().from(files).where(eq(files.id, fileId)))[0],
    );
  });
  if (file?.state !== 'verified') throw notFound('file');
  const { body } = await getObject(file.storageKey);
  return new Response(Readable.toWeb(body) as ReadableStream<Uint8Array>, {
    headers: fileHeaders(file, inline === '1'),
  });
}

export async function readSharedFile(ctx: Ctx, _input: Input, content: Response): Promise<Response> {
  authorize(ctx, 'public.use');
  return Promise.resolve(content);
}
