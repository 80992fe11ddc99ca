import { endpoint, endpointInSteps } from '@/lib/api/endpoint';

import * as contract from './contract';
import { shareDossier, withdrawDossierLink } from './dossier-links';
import { getDossier, listMadeDossiers, openDossierLink, requestDossier } from './queries';
import { readDossierLink } from './read-dossier-link';
import { openSharedFile, readSharedFile } from './read-shared-file';

export const getDossierEndpoint = endpoint(contract.getDossier, getDossier);
export const listMadeDossiersEndpoint = endpoint(contract.listMadeDossiers, listMadeDossiers);
export const requestDossierEndpoint = endpoint(contract.requestDossier, requestDossier);
export const shareDossierEndpoint = endpoint(contract.shareDossier, shareDossier);
export const withdrawDossierLinkEndpoint = endpoint(contract.withdrawDossierLink, withdrawDossierLink);
export const readDossierLinkEndpoint = endpoint(contract.readDossierLink, readDossierLink);
export const openDossierLinkEndpoint = endpoint(contract.openDossierLink, openDossierLink);
export const readSharedFileEndpoint = endpointInSteps(contract.readSharedFile, {
  outside: openSharedFile,
  run: readSharedFile,
});
