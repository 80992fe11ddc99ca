import { serve } from '@/app/_kit/serve';
import { completeUploadEndpoint } from '@/lib/files/endpoints';

export const POST = serve(completeUploadEndpoint);
