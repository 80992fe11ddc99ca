import { serve } from '@/app/_kit/serve';
import { disposeNonconformanceEndpoint } from '@/lib/nonconformances/endpoints';

export const POST = serve(disposeNonconformanceEndpoint);
