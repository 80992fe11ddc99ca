import { mailTo } from '../support/inbox';
import { expect, type Person } from '../support/journey';
import { somePaper } from '../support/papers';

/** From the mailed link: count, promise, certificate and invoice. */
export async function answerFromMail(
  processor: Person,
  { desk, number, pieces }: { desk: string; number: string; pieces: number },
): Promise<void> {
  const { page } = processor;
  const mail = await mailTo(desk, number);
  const link = mail.links.find((one) => one.includes('/b/')) ?? '';
  // A scanner that fetches the link first changes nothing for the person.
  expect((await page.request.get(link)).status()).toBe(200);
  await processor.goTo(new URL(link).pathname);
  await processor.looks('processor-link');
  await processor.press(page.getByRole('button', { name: `Open ${number}` }));
  await page.waitForURL(/\/portal\/batches\//);
  const days = page.getByRole('group', { name: 'When will they be done' });
  await processor.press(days.getByRole('button').or(days.getByRole('radio')).first());
  await processor.looks('processor-first');
  await processor.press(page.getByRole('button', { name: new RegExp(`^I have ${pieces}`) }));
  await processor.sees(page.getByText(`You have ${pieces} pieces`));
  const invoiced = `${number}, ${pieces} pieces at 5.00`;
  await sendPaper(processor, 'Certificate', await somePaper('Certificate', `${number}, ${pieces} pieces`));
  await sendPaper(processor, 'Invoice', await somePaper('Invoice', invoiced));
  await processor.looks('processor-papers');
}

async function sendPaper(processor: Person, kind: string, content: Buffer): Promise<void> {
  const { page } = processor;
  const name = `${kind.toLowerCase()}.pdf`;
  await processor.press(
    page.getByRole('group', { name: 'What do you send' }).getByText(kind, { exact: true }),
  );
  await processor.gives(page.locator('input[type=file]').first(), name, content);
  await processor.sees(page.getByRole('list', { name: 'Papers sent' }).getByText(name));
}
