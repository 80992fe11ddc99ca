import { serve } from '@/app/_kit/serve';
import { changeEquipmentEndpoint } from '@/lib/equipment/endpoints';

export const PUT = serve(changeEquipmentEndpoint);
