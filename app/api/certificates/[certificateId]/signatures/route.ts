import { serve } from '@/app/_kit/serve';
import { signCertificateEndpoint } from '@/lib/certificates/endpoints';

export const POST = serve(signCertificateEndpoint);
