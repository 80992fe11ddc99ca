import { eq, sql } from 'drizzle-orm';

import { parts } from '@/db/schema/parts';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';

import type { LotInput } from './contract';
import { dayMade } from './day-made';
import { firstTwice } from './import-row';
import { isTaken, makeLot, noRoute } from './make-lot';

/** Adds pieces of one part, made together from one heat. */
export async function createLot(ctx: Ctx, input: LotInput) {
  authorize(ctx, 'lot.create');
  const part = await readPart(ctx, input.partId);
  if (part.firstStepId === null) throw wrong('partId', noRoute(part));
  if (input.number !== '' && (await isTaken(ctx, input.number)))
    throw wrong(
      'number',
      `Lot ${input.number} is here already. Enter another number, or leave it empty for the next one.`,
    );
  const pieces = countOf(input, part.serialised);
  if (input.millCertificateFileId !== null)
    await requireVerifiedFile(ctx, {
      fileId: input.millCertificateFileId,
      purpose: 'mill_certificate',
      field: 'millCertificateFileId',
    });

  return makeLot(ctx, {
    part,
    pieces,
    number: input.number,
    heat: input.heat,
    serials: input.serials,
    madeOn: await dayMade(ctx, input.madeOn),
    millCertificateFileId: input.millCertificateFileId,
    note: input.note === '' ? null : input.note,
  });
}

function countOf({ pieces, serials }: LotInput, serialised: boolean): number {
  if (!serialised) {
    if (serials.length > 0)
      throw wrong(
        'serials',
        'The pieces of this part have no numbers of their own. Enter how many there are.',
      );
    if (pieces === null) throw wrong('pieces', 'Pieces are missing. Enter how many there are.');
    return pieces;
  }
  if (serials.length === 0)
    throw wrong('serials', 'Each piece of this part has its own serial. List them, one a line.');
  const twice = firstTwice(serials);
  if (twice !== null) throw wrong('serials', `Serial ${twice} is there twice. Each piece has its own.`);
  if (pieces !== null && pieces !== serials.length)
    throw wrong('serials', `${pieces} pieces, but ${serials.length} serials. Each piece has one.`);
  return serials.length;
}

async function readPart(ctx: Ctx, partId: string) {
  const [part] = await ctx.tx
    .select({
      id: parts.id,
      number: parts.number,
      revision: parts.revision,
      serialised: parts.serialised,
      firstStepId: sql<
        string | null
      >`(select s.id from route_steps s where s.part_id = parts.id order by s.seq limit 1)`,
    })
    .from(parts)
    .where(eq(parts.id, partId));
  if (!part)
    throw wrong('partId', 'This part belongs to another shop, or it does not exist. Choose another.');
  return part;
}

const wrong = (field: string, message: string): AppError =>
  new AppError('bad_input', message, { fields: [{ field, message }] });
