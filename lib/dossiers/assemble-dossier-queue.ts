import { z } from 'zod';

export const assembleDossierQueue = {
  name: 'assemble-dossier',
  payload: z.object({ shopId: z.uuid(), dossierId: z.uuid() }),
};
