import { serve } from '@/app/_kit/serve';
import { listBatchDocumentsEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(listBatchDocumentsEndpoint);
