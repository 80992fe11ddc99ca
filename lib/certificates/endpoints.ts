import { endpoint, endpointInSteps } from '@/lib/api/endpoint';
import { tryPasswordAgain } from '@/lib/people/try-password-again';

import { addCertificate } from './add-certificate';
import * as contract from './contract';
import { decideRequirement } from './decide-requirement';
import { decideRequirements } from './decide-requirements';
import { getCertificate } from './get-certificate';
import { listCertificates } from './list-certificates';
import * as proving from './prove-contract';
import { recordCertificate } from './record-certificate';
import { setAsideCertificate } from './set-aside-certificate';
import { signCertificate } from './sign-certificate';
import { takeUpCertificate } from './take-up-certificate';

export const listCertificatesEndpoint = endpoint(contract.listCertificates, listCertificates);
export const getCertificateEndpoint = endpoint(contract.getCertificate, getCertificate);
export const addCertificateEndpoint = endpoint(contract.addCertificate, addCertificate);
export const recordCertificateEndpoint = endpoint(proving.recordCertificate, recordCertificate);
export const decideRequirementEndpoint = endpoint(proving.decideRequirement, decideRequirement);
export const decideRequirementsEndpoint = endpoint(proving.decideRequirements, decideRequirements);
export const setAsideCertificateEndpoint = endpoint(proving.setAsideCertificate, setAsideCertificate);
export const takeUpCertificateEndpoint = endpoint(proving.takeUpCertificate, takeUpCertificate);
export const signCertificateEndpoint = endpointInSteps(proving.signCertificate, {
  outside: tryPasswordAgain,
  run: signCertificate,
});
