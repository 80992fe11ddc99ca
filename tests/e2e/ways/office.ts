import { dayIn } from '../support/day-in';
import type { Person } from '../support/journey';

/** Types what the invoice says, approves it and pays; done when the payment service has said so. */
export async function enterAndPay(
  office: Person,
  { batchId, amount }: { batchId: string; amount: string },
): Promise<void> {
  const { page } = office;
  const invoices = await page.request.get(`/api/invoices?batchId=${batchId}`);
  const { rows } = (await invoices.json()) as { rows: { id: string }[] };
  await office.goTo(`/invoices/${rows[0]?.id ?? ''}?enter=1`);
  await office.type(page.getByLabel('Number of the invoice'), `SF-${String(Date.now()).slice(-6)}`);
  await office.type(page.getByLabel('Dated'), dayIn(0));
  await office.type(page.getByLabel('Total it asks for'), amount);
  await office.looks('invoice-enter');
  await office.press(page.getByRole('button', { name: 'Hold it against the order' }));
  await office.press(page.getByRole('button', { name: `Approve ${amount}` }));
  await office.sees(page.getByRole('button', { name: `Pay ${amount}` }));
  await office.looks('invoice');
  await office.press(page.getByRole('button', { name: `Pay ${amount}` }));
  await office.press(page.getByRole('dialog').getByRole('button', { name: `Pay ${amount}` }));
  await office.sees(page.getByText(`Paid ${amount}`).first());
}
