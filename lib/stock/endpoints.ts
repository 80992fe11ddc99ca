import { endpoint } from '@/lib/api/endpoint';

import { addLocation } from './add-location';
import { closeLocation, reopenLocation } from './close-location';
import * as contract from './contract';
import { fitPieces } from './fit-pieces';
import { moveStock } from './move-stock';
import * as queries from './queries';
import { releasePieces } from './release-pieces';
import { takeOutPieces } from './take-out-pieces';

export const listLocationsEndpoint = endpoint(contract.listLocations, queries.listLocations);
export const addLocationEndpoint = endpoint(contract.addLocation, addLocation);
export const closeLocationEndpoint = endpoint(contract.closeLocation, closeLocation);
export const reopenLocationEndpoint = endpoint(contract.reopenLocation, reopenLocation);
export const listStockEndpoint = endpoint(contract.listStock, queries.listStock);
export const getStockSpotEndpoint = endpoint(contract.getStockSpot, queries.getStockSpot);
export const getGateEndpoint = endpoint(contract.getGate, queries.getGate);
export const releasePiecesEndpoint = endpoint(contract.releasePieces, releasePieces);
export const listReleasesEndpoint = endpoint(contract.listReleases, queries.listReleases);
export const fitPiecesEndpoint = endpoint(contract.fitPieces, fitPieces);
export const takeOutPiecesEndpoint = endpoint(contract.takeOutPieces, takeOutPieces);
export const moveStockEndpoint = endpoint(contract.moveStock, moveStock);
