import { serve } from '@/app/_kit/serve';
import { changeLineEndpoint, removeLineEndpoint } from '@/lib/batches/endpoints';

export const PATCH = serve(changeLineEndpoint);
export const DELETE = serve(removeLineEndpoint);
