import { serve } from '@/app/_kit/serve';
import { addCertificateEndpoint, listCertificatesEndpoint } from '@/lib/certificates/endpoints';

export const GET = serve(listCertificatesEndpoint);
export const POST = serve(addCertificateEndpoint);
