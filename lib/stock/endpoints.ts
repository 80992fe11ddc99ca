import { endpoint } from '@/lib/api/endpoint';

import { addLocation } from './add-location';
import * as contract from './contract';
import { fitPieces, moveStock } from './fit-pieces';
import * as queries from './queries';
import { releasePieces } from './release-pieces';

export const listLocationsEndpoint = endpoint(contract.listLocations, queries.listLocations);
export const addLocationEndpoint = endpoint(contract.addLocation, addLocation);
export const listStockEndpoint = endpoint(contract.listStock, queries.listStock);
export const getGateEndpoint = endpoint(contract.getGate, queries.getGate);
export const releasePiecesEndpoint = endpoint(contract.releasePieces, releasePieces);
export const listReleasesEndpoint = endpoint(contract.listReleases, queries.listReleases);
export const fitPiecesEndpoint = endpoint(contract.fitPieces, fitPieces);
export const moveStockEndpoint = endpoint(contract.moveStock, moveStock);
