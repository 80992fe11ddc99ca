import { serve } from '@/app/_kit/serve';
import { takeUpCertificateEndpoint } from '@/lib/certificates/endpoints';

export const POST = serve(takeUpCertificateEndpoint);
