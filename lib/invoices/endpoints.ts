import { endpoint } from '@/lib/api/endpoint';

import { approveInvoice, approveInvoiceSecond } from './approve-invoice';
import { clearDifference, undoClearance } from './clear-difference';
import * as contract from './contract';
import { creditInvoice } from './credit-invoice';
import { addInvoice, enterInvoice } from './enter-invoice';
import { getInvoiceReading } from './get-invoice-reading';
import * as paying from './pay-contract';
import { payInvoice } from './pay-invoice';
import * as queries from './queries';
import { getInvoiceReading as readingDeclared } from './reading-contract';
import { refuseInvoice } from './refuse-invoice';
import { waivePayment } from './waive-payment';

export const listInvoicesEndpoint = endpoint(contract.listInvoices, queries.listInvoices);
export const getInvoiceEndpoint = endpoint(contract.getInvoice, queries.getInvoice);
export const getInvoiceReadingEndpoint = endpoint(readingDeclared, getInvoiceReading);
export const addInvoiceEndpoint = endpoint(contract.addInvoice, addInvoice);
export const enterInvoiceEndpoint = endpoint(contract.enterInvoice, enterInvoice);
export const clearDifferenceEndpoint = endpoint(contract.clearDifference, clearDifference);
export const undoClearanceEndpoint = endpoint(contract.undoClearance, undoClearance);
export const approveInvoiceEndpoint = endpoint(paying.approveInvoice, approveInvoice);
export const approveInvoiceSecondEndpoint = endpoint(paying.approveInvoiceSecond, approveInvoiceSecond);
export const refuseInvoiceEndpoint = endpoint(paying.refuseInvoice, refuseInvoice);
export const creditInvoiceEndpoint = endpoint(paying.creditInvoice, creditInvoice);
export const payInvoiceEndpoint = endpoint(paying.payInvoice, payInvoice);
export const waivePaymentEndpoint = endpoint(paying.waivePayment, waivePayment);
