import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { readAgain } from './request-reading';
import { lockIntake } from './settle-intake';

/** Has a paper that waits for its batch read once more. */
export async function readIntakeAgain(ctx: Ctx, { intakeId }: { intakeId: string }) {
  authorize(ctx, 'certificate.add');
  const { fileId } = await lockIntake(ctx, intakeId);
  await readAgain(ctx, { fileId, kind: 'certificate' });
  await recordAudit(ctx, {
    action: 'intake.read_again',
    entity: 'intake',
    entityId: intakeId,
    after: { file: fileId },
  });
  return { state: 'waiting' as const };
}
