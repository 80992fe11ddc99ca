import { serve } from '@/app/_kit/serve';
import { setAsideCertificateEndpoint } from '@/lib/certificates/endpoints';

export const POST = serve(setAsideCertificateEndpoint);
