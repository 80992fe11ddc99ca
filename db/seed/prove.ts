import type { Ctx } from '@/lib/auth/context';
import { decideRequirement } from '@/lib/certificates/decide-requirement';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { recordCertificate } from '@/lib/certificates/record-certificate';
import { signCertificate } from '@/lib/certificates/sign-certificate';
import { getGate } from '@/lib/stock/queries';

import { certificateNumber } from './batch-papers';
import { DEMO_PASSWORD } from './sign-ins';

interface Proving {
  batchId: string;
  certificateId: string;
  /** Pieces of the last line that the paper does not cover. */
  uncovered: number;
  datedOn: string;
}

/** The inspector reads the certificate, finds each requirement met, and signs for what came back and is covered. */
export async function proveCertificate(
  ctx: Ctx,
  { batchId, certificateId, uncovered, datedOn }: Proving,
): Promise<void> {
  const { certificate, requirements, batch } = await getCertificate(ctx, { certificateId });
  await recordCertificate(ctx, {
    certificateId,
    version: certificate.version,
    number: certificateNumber(batch.number, ctx.now),
    datedOn,
  });
  for (const { id, limit, unit } of requirements) {
    await decideRequirement(ctx, {
      certificateId,
      requirementId: id,
      version: null,
      stated: [limit, unit].filter(Boolean).join(' ') || 'stated',
      verdict: 'meets',
      overrideReason: null,
      note: '',
    });
  }
  const read = await getCertificate(ctx, { certificateId });
  const { lines } = await getGate(ctx, { batchId });
  const coverage = lines.flatMap((line, at) => {
    const inQuarantine = line.missing.find((one) => one.reason === 'not_proved')?.pieces ?? 0;
    const pieces = inQuarantine - (at === lines.length - 1 ? uncovered : 0);
    return pieces > 0 ? [{ lineId: line.lineId, pieces }] : [];
  });
  await signCertificate(ctx, {
    certificateId,
    version: read.certificate.version,
    coverage,
    decisions: read.requirements.flatMap(({ id, decision }) =>
      decision ? [{ requirementId: id, version: decision.version }] : [],
    ),
    password: DEMO_PASSWORD,
    reviewSeconds: null,
  });
}
