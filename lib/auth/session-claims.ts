import { z } from 'zod';

/** What the signed cookie says. Everything else about the person is read anew with each request. */
export const SessionClaims = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('person'),
    userId: z.uuid(),
    sessionVersion: z.int(),
    shopId: z.uuid().optional(),
    processorId: z.uuid().optional(),
  }),
  z.object({ kind: z.literal('link'), linkId: z.uuid() }),
]);
export type SessionClaims = z.infer<typeof SessionClaims>;
