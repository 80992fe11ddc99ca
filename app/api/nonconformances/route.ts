import { serve } from '@/app/_kit/serve';
import { listNonconformancesEndpoint, raiseNonconformanceEndpoint } from '@/lib/nonconformances/endpoints';

export const GET = serve(listNonconformancesEndpoint);
export const POST = serve(raiseNonconformanceEndpoint);
