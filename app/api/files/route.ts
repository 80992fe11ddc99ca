import { serve } from '@/app/_kit/serve';
import { requestUploadEndpoint } from '@/lib/files/endpoints';

export const POST = serve(requestUploadEndpoint);
