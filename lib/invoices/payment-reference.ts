/** What the transfer carries and the remittance repeats, so that the two find each other on a bank statement. */
export const paymentReference = ({
  invoiceNumber,
  orderNumber,
}: {
  invoiceNumber: string;
  orderNumber: string;
}): string => `Invoice ${invoiceNumber}, order ${orderNumber}`;
