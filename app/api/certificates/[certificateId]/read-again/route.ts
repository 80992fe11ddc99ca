import { serve } from '@/app/_kit/serve';
import { readCertificateAgainEndpoint } from '@/lib/readings/endpoints';

export const POST = serve(readCertificateAgainEndpoint);
