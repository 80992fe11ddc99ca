import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ProveScreen } from '@/components/certificates/prove-screen';
import { getCertificateEndpoint } from '@/lib/certificates/endpoints';
import { getCertificateReadingEndpoint } from '@/lib/readings/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Prove a certificate' };

export default async function CertificatePage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(getCertificateEndpoint, { certificateId: id }),
        ask(getCertificateReadingEndpoint, { certificateId: id }),
      ]}
    >
      <ProveScreen certificateId={id} />
    </Prefetched>
  );
}
