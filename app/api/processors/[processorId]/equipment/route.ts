import { serve } from '@/app/_kit/serve';
import { addEquipmentEndpoint, listEquipmentEndpoint } from '@/lib/equipment/endpoints';

export const GET = serve(listEquipmentEndpoint);
export const POST = serve(addEquipmentEndpoint);
