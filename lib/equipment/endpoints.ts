import { endpoint } from '@/lib/api/endpoint';

import { addEquipment, changeEquipment, retireEquipment } from './change-equipment';
import * as contract from './contract';
import { listEquipment } from './queries';

export const listEquipmentEndpoint = endpoint(contract.listEquipment, listEquipment);
export const addEquipmentEndpoint = endpoint(contract.addEquipment, addEquipment);
export const changeEquipmentEndpoint = endpoint(contract.changeEquipment, changeEquipment);
export const retireEquipmentEndpoint = endpoint(contract.retireEquipment, retireEquipment);
