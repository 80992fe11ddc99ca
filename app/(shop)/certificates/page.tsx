import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { CertificatesScreen } from '@/components/certificates/certificates-screen';
import { listCertificatesEndpoint } from '@/lib/certificates/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Certificates' };

export default function CertificatesPage() {
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listCertificatesEndpoint, {})]}>
      <CertificatesScreen />
    </Prefetched>
  );
}
