import { serve } from '@/app/_kit/serve';
import { listPortalMessagesEndpoint, writeToShopEndpoint } from '@/lib/portal/endpoints';

export const GET = serve(listPortalMessagesEndpoint);
export const POST = serve(writeToShopEndpoint);
