import { serve } from '@/app/_kit/serve';
import { getShopSettingsEndpoint, updateShopSettingsEndpoint } from '@/lib/organisations/endpoints';

export const GET = serve(getShopSettingsEndpoint);
export const PUT = serve(updateShopSettingsEndpoint);
