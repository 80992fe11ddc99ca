import { endpoint } from '@/lib/api/endpoint';

import { addFromFile } from './add-from-file';
import * as contract from './contract';
import { correctReading } from './correct-reading';
import { getCertificateReading } from './get-certificate-reading';
import * as intakeContract from './intake-contract';
import { listIntake } from './list-intake';
import { readCertificateAgain } from './read-certificate-again';
import { readIntakeAgain } from './read-intake-again';
import { addToIntake, assignIntake, setAsideIntake } from './settle-intake';

export const getCertificateReadingEndpoint = endpoint(contract.getCertificateReading, getCertificateReading);
export const readCertificateAgainEndpoint = endpoint(contract.readCertificateAgain, readCertificateAgain);
export const correctReadingEndpoint = endpoint(contract.correctReading, correctReading);
export const addFromFileEndpoint = endpoint(contract.addFromFile, addFromFile);
export const listIntakeEndpoint = endpoint(intakeContract.listIntake, listIntake);
export const addToIntakeEndpoint = endpoint(intakeContract.addToIntake, addToIntake);
export const readIntakeAgainEndpoint = endpoint(intakeContract.readIntakeAgain, readIntakeAgain);
export const assignIntakeEndpoint = endpoint(intakeContract.assignIntake, assignIntake);
export const setAsideIntakeEndpoint = endpoint(intakeContract.setAsideIntake, setAsideIntake);
