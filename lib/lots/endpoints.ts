import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { createLot } from './create-lot';
import { editLot } from './edit-lot';
import { checkLotImport, importLots } from './import-lots';
import * as queries from './queries';

export const listLotsEndpoint = endpoint(contract.listLots, queries.listLots);
export const getLotEndpoint = endpoint(contract.getLot, queries.getLot);
export const listMovementsEndpoint = endpoint(contract.listMovements, queries.listMovements);
export const createLotEndpoint = endpoint(contract.createLot, createLot);
export const editLotEndpoint = endpoint(contract.editLot, editLot);
export const checkLotImportEndpoint = endpoint(contract.checkLotImport, checkLotImport);
export const importLotsEndpoint = endpoint(contract.importLots, importLots);
