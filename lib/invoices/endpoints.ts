import { endpoint } from '@/lib/api/endpoint';

import { approveInvoice, approveInvoiceSecond } from './approve-invoice';
import { clearDifference, undoClearance } from './clear-difference';
import * as contract from './contract';
import { creditInvoice } from './credit-invoice';
import { addInvoice, enterInvoice } from './enter-invoice';
import { getInvoiceReading } from './get-invoice-reading';
import { payInvoice } from './pay-invoice';
import * as queries from './queries';
import { readInvoiceAgain } from './read-invoice-again';
import * as readingContract from './reading-contract';
import { refuseInvoice } from './refuse-invoice';
import { waivePayment } from './waive-payment';

export const listInvoicesEndpoint = endpoint(contract.listInvoices, queries.listInvoices);
export const getInvoiceEndpoint = endpoint(contract.getInvoice, queries.getInvoice);
export const getInvoiceReadingEndpoint = endpoint(readingContract.getInvoiceReading, getInvoiceReading);
export const readInvoiceAgainEndpoint = endpoint(readingContract.readInvoiceAgain, readInvoiceAgain);
export const addInvoiceEndpoint = endpoint(contract.addInvoice, addInvoice);
export const enterInvoiceEndpoint = endpoint(contract.enterInvoice, enterInvoice);
export const clearDifferenceEndpoint = endpoint(contract.clearDifference, clearDifference);
export const undoClearanceEndpoint = endpoint(contract.undoClearance, undoClearance);
export const approveInvoiceEndpoint = endpoint(contract.approveInvoice, approveInvoice);
export const approveInvoiceSecondEndpoint = endpoint(contract.approveInvoiceSecond, approveInvoiceSecond);
export const refuseInvoiceEndpoint = endpoint(contract.refuseInvoice, refuseInvoice);
export const creditInvoiceEndpoint = endpoint(contract.creditInvoice, creditInvoice);
export const payInvoiceEndpoint = endpoint(contract.payInvoice, payInvoice);
export const waivePaymentEndpoint = endpoint(contract.waivePayment, waivePayment);
