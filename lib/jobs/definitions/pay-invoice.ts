import { payInvoiceQueue } from '@/lib/invoices/pay-invoice-queue';
import { sendPayment } from '@/lib/invoices/send-payment';

import { job } from '../job';

export const payInvoiceJob = job({ ...payInvoiceQueue, retries: 14, retryDelayS: 5, run: sendPayment });
