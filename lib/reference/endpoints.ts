import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { checkOwnTable, enterOwnTable, withdrawOwnTable } from './enter-own-table';
import { getReferenceTable, getTablesInForce, listReferenceTables } from './queries';

export const listReferenceTablesEndpoint = endpoint(contract.listReferenceTables, listReferenceTables);
export const getReferenceTableEndpoint = endpoint(contract.getReferenceTable, getReferenceTable);
export const getTablesInForceEndpoint = endpoint(contract.getTablesInForce, getTablesInForce);
export const checkOwnTableEndpoint = endpoint(contract.checkOwnTable, checkOwnTable);
export const enterOwnTableEndpoint = endpoint(contract.enterOwnTable, enterOwnTable);
export const withdrawOwnTableEndpoint = endpoint(contract.withdrawOwnTable, withdrawOwnTable);
