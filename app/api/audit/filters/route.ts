import { serve } from '@/app/_kit/serve';
import { listAuditFiltersEndpoint } from '@/lib/audit/endpoints';

export const GET = serve(listAuditFiltersEndpoint);
