import { serve } from '@/app/_kit/serve';
import { getCertificateReadingEndpoint } from '@/lib/readings/endpoints';

export const GET = serve(getCertificateReadingEndpoint);
