import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { getShopSettings, updateShopSettings } from './shop-settings';

export const getShopSettingsEndpoint = endpoint(contract.getShopSettings, getShopSettings);
export const updateShopSettingsEndpoint = endpoint(contract.updateShopSettings, updateShopSettings);
