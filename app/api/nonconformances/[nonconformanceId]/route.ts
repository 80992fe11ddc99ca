import { serve } from '@/app/_kit/serve';
import { getNonconformanceEndpoint } from '@/lib/nonconformances/endpoints';

export const GET = serve(getNonconformanceEndpoint);
