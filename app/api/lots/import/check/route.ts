import { serve } from '@/app/_kit/serve';
import { checkLotImportEndpoint } from '@/lib/lots/endpoints';

export const POST = serve(checkLotImportEndpoint);
