import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { BINARY, Done, Id, Moment } from '@/lib/api/shapes';

import type { DossierContent, DossierFile } from './content';

/** Where bytes lie in storage is nobody's business outside. */
export type DossierEvidence = Omit<DossierContent, 'files'> & { files: Omit<DossierFile, 'storageKey'>[] };
const Evidence = z.custom<DossierEvidence>();

export const DossierMade = z.object({
  id: Id,
  statedAt: Moment,
  requestedBy: z.string(),
  finished: z.boolean(),
  /** Why the last try did not make it; it may still be tried again. */ failure: z.string().nullable(),
  documentFileId: Id.nullable(),
  archiveFileId: Id.nullable(),
});
export type DossierMade = z.output<typeof DossierMade>;

export const getDossier = declare({
  id: 'getDossier',
  method: 'get',
  path: '/lots/{lotId}/dossier',
  summary: 'All the evidence of a lot, and the links given out to it',
  side: 'shop',
  permission: 'dossier.read',
  input: z.object({ lotId: Id }),
  response: z.object({
    evidence: Evidence,
    links: z.array(
      z.object({
        id: Id,
        forWhom: z.string(),
        expiresAt: Moment,
        withdrawnAt: Moment.nullable(),
        createdBy: z.string(),
        createdAt: Moment,
      }),
    ),
  }),
});

export const listMadeDossiers = declare({
  id: 'listMadeDossiers',
  method: 'get',
  path: '/lots/{lotId}/dossiers',
  summary: 'The last dossiers that were asked for of a lot: made, being made, or failed',
  side: 'shop',
  permission: 'dossier.read',
  input: z.object({ lotId: Id }),
  response: z.object({ rows: z.array(DossierMade) }),
});

export const requestDossier = declare({
  id: 'requestDossier',
  method: 'post',
  path: '/lots/{lotId}/dossier',
  summary: 'Make the dossier of a lot as one document and one archive of every original',
  side: 'shop',
  permission: 'dossier.read',
  input: z.object({ lotId: Id }),
  response: z.object({ id: Id }),
});

export const shareDossier = declare({
  id: 'shareDossier',
  method: 'post',
  path: '/lots/{lotId}/dossier-links',
  summary: 'A read-only link to a dossier for somebody outside; the address is told once',
  side: 'shop',
  permission: 'dossier.share',
  input: z.object({
    lotId: Id,
    forWhom: z.string().trim().min(2, 'Say for whom it is.').max(120),
    days: z.int().min(1, 'At least 1 day.').max(366, 'At most 366 days.'),
  }),
  response: z.object({ id: Id, url: z.string() }),
});

export const withdrawDossierLink = declare({
  id: 'withdrawDossierLink',
  method: 'post',
  path: '/dossier-links/{linkId}/withdraw',
  summary: 'End a dossier link now',
  side: 'shop',
  permission: 'dossier.share',
  input: z.object({ linkId: Id }),
  response: Done,
});

const Token = z.string().min(16).max(200);

export const readDossierLink = declare({
  id: 'readDossierLink',
  method: 'get',
  path: '/shared-dossiers/{token}/state',
  summary: 'Whether a dossier link still opens, and whose it is',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: z.string().max(400) }),
  response: z.object({
    state: z.enum(['open', 'ended', 'withdrawn', 'unknown']),
    shop: z.string().nullable(),
    phone: z.string().nullable(),
    zone: z.string().nullable(),
    endedAt: Moment.nullable(),
  }),
});
export type DossierLinkFace = z.output<(typeof readDossierLink)['response']>;

export const openDossierLink = declare({
  id: 'openDossierLink',
  method: 'get',
  path: '/shared-dossiers/{token}',
  summary: 'What a dossier link shows',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: Token }),
  response: z.object({
    forWhom: z.string(),
    expiresAt: Moment,
    evidence: Evidence,
    made: DossierMade.nullable(),
  }),
});

export const readSharedFile = declare({
  id: 'readSharedFile',
  method: 'get',
  path: '/shared-dossiers/{token}/files/{fileId}',
  summary: 'One file of a shared dossier: the document, the archive or an original',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: Token, fileId: Id, inline: z.enum(['0', '1']).default('0') }),
  response: BINARY,
});
