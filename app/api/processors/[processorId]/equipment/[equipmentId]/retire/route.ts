import { serve } from '@/app/_kit/serve';
import { retireEquipmentEndpoint } from '@/lib/equipment/endpoints';

export const POST = serve(retireEquipmentEndpoint);
