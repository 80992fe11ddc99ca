import { serve } from '@/app/_kit/serve';
import { listAuditEndpoint } from '@/lib/audit/endpoints';

export const GET = serve(listAuditEndpoint);
