import { serve } from '@/app/_kit/serve';
import { addLocationEndpoint, listLocationsEndpoint } from '@/lib/stock/endpoints';

export const GET = serve(listLocationsEndpoint);
export const POST = serve(addLocationEndpoint);
