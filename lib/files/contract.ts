import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { BINARY, Id, Moment } from '@/lib/api/shapes';

import { FILE_PURPOSES, FILE_STATES } from './purpose';

/** One file as screens show it. */
export const FileView = z.object({
  id: Id,
  name: z.string(),
  mediaType: z.string(),
  size: z.int(),
  purpose: z.enum(FILE_PURPOSES),
  state: z.enum(FILE_STATES),
  sha256: z.string().nullable(),
  refusal: z.string().nullable(),
  batchId: Id.nullable(),
  uploadedBy: z.string(),
  createdAt: Moment,
});
export type FileView = z.output<typeof FileView>;

/** Where the bytes go: a PUT of exactly these headers and exactly the announced bytes, soon. */
export const SignedUpload = z.object({
  method: z.literal('PUT'),
  url: z.string(),
  headers: z.record(z.string(), z.string()),
  expiresAt: Moment,
});
export type SignedUpload = z.output<typeof SignedUpload>;

export const requestUpload = declare({
  id: 'requestUpload',
  method: 'post',
  path: '/files',
  summary: 'Announce a file and get the address its bytes go to',
  side: 'any',
  permission: 'file.add',
  input: z.object({
    purpose: z.enum(FILE_PURPOSES),
    batchId: Id.optional(),
    name: z
      .string()
      .min(1, 'The file has no name.')
      .max(1000, 'The name of the file is longer than 1000 characters.'),
    mediaType: z.string().max(200).default(''),
    size: z.int().min(0),
    sha256: z.string().regex(/^[0-9a-f]{64}$/, 'Give the SHA-256 of the file as 64 hexadecimal digits.'),
  }),
  /** `upload` is null where these very bytes are here already and can be used as they are. */
  response: z.object({ file: FileView, upload: SignedUpload.nullable() }),
});

export const completeUpload = declare({
  id: 'completeUpload',
  method: 'post',
  path: '/files/{fileId}/complete',
  summary: 'Say that the bytes are sent; they are read back and only then count',
  side: 'any',
  permission: 'file.add',
  input: z.object({ fileId: Id }),
  response: FileView,
});

export const getFile = declare({
  id: 'getFile',
  method: 'get',
  path: '/files/{fileId}',
  summary: 'What is known of one file',
  side: 'any',
  permission: 'file.read',
  input: z.object({ fileId: Id }),
  response: FileView,
});

export const readFileContent = declare({
  id: 'readFileContent',
  method: 'get',
  path: '/files/{fileId}/content',
  summary: 'The file as it was received; `inline=1` shows a PDF or a picture instead of saving it',
  side: 'any',
  permission: 'file.read',
  input: z.object({ fileId: Id, inline: z.enum(['0', '1']).default('0') }),
  response: BINARY,
});
