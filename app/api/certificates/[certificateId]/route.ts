import { serve } from '@/app/_kit/serve';
import { getCertificateEndpoint, recordCertificateEndpoint } from '@/lib/certificates/endpoints';

export const GET = serve(getCertificateEndpoint);
export const PATCH = serve(recordCertificateEndpoint);
