import { mailTo } from './support/inbox';
import { test, type Person } from './support/journey';
import { buildAndDispatch, makePartAndLot } from './ways/lead';
import { answerFromMail } from './ways/processor';
import { dayIn } from './support/day-in';

const PIECES = 6;
const DESK = 'desk@sallowfinch.test';

/** What goes wrong in a yard: it takes longer, a piece comes back bent, the invoice asks for it all the same. */
test('a batch with trouble: re-issued, counted in with one damaged, scrapped, its invoice refused', async ({
  person,
}) => {
  test.setTimeout(600_000);
  const work = { partNumber: `MC-8${String(Date.now()).slice(-6)}`, pieces: PIECES };
  const lead = await person('Lead');
  await lead.signIn('liv@merganser.test');
  await makePartAndLot(lead, work);
  const batch = await buildAndDispatch(lead, work);

  const processor = await person('Processor', 390);
  await answerFromMail(processor, { desk: DESK, number: batch.number, pieces: PIECES });
  await reportTrouble(processor);
  processor.report('answer, then report trouble');

  await reissueLater(lead, batch);
  await mailTo(DESK, `${batch.number} from Merganser Cove Aircraft: changed`);
  lead.report('read the trouble and re-issue');

  const inspector = await person('Inspector', 820);
  await inspector.signIn('amos@merganser.test');
  await countOneDamaged(inspector, batch.id);
  await scrapIt(inspector);
  inspector.report('count in with one damaged, scrap it');

  const office = await person('Office');
  await office.signIn('petra@merganser.test');
  await refuseInvoice(office, batch.id);
  await mailTo(DESK, 'Merganser Cove Aircraft refused invoice');
  office.report('enter an invoice that does not match, refuse it');
});

test('a batch that left by mistake is cancelled: its pieces wait again, its link says so, the processor is told', async ({
  person,
}) => {
  test.setTimeout(300_000);
  const work = { partNumber: `MC-7${String(Date.now()).slice(-6)}`, pieces: PIECES };
  const lead = await person('Lead', 820);
  await lead.signIn('liv@merganser.test');
  await makePartAndLot(lead, work);
  const batch = await buildAndDispatch(lead, work);
  const link = (await mailTo(DESK, batch.number)).links.find((one) => one.includes('/b/')) ?? '';
  await lead.press(lead.page.getByRole('button', { name: 'Cancel it' }));
  await lead.type(lead.page.getByLabel('Why'), 'It left with the wrong drawing.');
  await lead.press(lead.page.getByRole('dialog').getByRole('button', { name: `Cancel ${batch.number}` }));
  await lead.sees(lead.page.getByText('wait for the step again').first());
  await lead.looks('batch-cancelled');
  await mailTo(DESK, `${batch.number} from Merganser Cove Aircraft is cancelled`);
  const processor = await person('Processor', 390);
  await processor.goTo(new URL(link).pathname);
  await processor.sees(processor.page.getByText(`has cancelled ${batch.number}`));
  await processor.looks('processor-cancelled');
  lead.report('cancel a batch that left');
});

async function reportTrouble(processor: Person): Promise<void> {
  const { page } = processor;
  const section = page.getByRole('region', { name: /trouble/ });
  await processor.type(section.getByRole('textbox').first(), 'The tank is down until Thursday.');
  await processor.press(section.getByRole('button', { name: 'Report trouble' }));
  await processor.sees(section.getByText('The tank is down until Thursday.'));
  await processor.looks('processor-trouble');
}

async function reissueLater(lead: Person, batch: { id: string; number: string }): Promise<void> {
  const { page } = lead;
  await lead.goTo(`/batches/${batch.id}`);
  await lead.sees(page.getByText('The tank is down until Thursday.').first());
  await lead.press(page.getByRole('link', { name: 'Re-issue' }));
  await lead.type(page.getByLabel('Wanted back'), dayIn(21));
  await lead.sees(page.getByRole('list', { name: 'What is different' }).getByRole('listitem'));
  await lead.looks('reissue');
  await lead.press(page.getByRole('button', { name: 'Re-issue and tell the processor' }));
  await page.waitForURL(new RegExp(`/batches/${batch.id}$`));
  await lead.sees(page.getByText('re-issued as version 2'));
}

async function countOneDamaged(inspector: Person, batchId: string): Promise<void> {
  const { page } = inspector;
  await inspector.goTo(`/batches/${batchId}/receive`);
  await inspector.type(page.getByLabel('Good'), String(PIECES - 1));
  await inspector.type(page.getByLabel('Damaged'), '1');
  await inspector.type(page.getByLabel('What is wrong with line 1'), 'Bent at the lug.');
  await inspector.looks('receive-damaged');
  await inspector.press(page.getByRole('button', { name: `Count in ${PIECES}` }));
  await page.waitForURL(/\/batches\/[0-9a-f-]{36}$/);
}

async function scrapIt(inspector: Person): Promise<void> {
  const { page } = inspector;
  const held = page.getByRole('region', { name: 'Nonconformances' });
  await inspector.press(held.getByRole('table').getByRole('link').first());
  await inspector.press(page.getByRole('radio', { name: /^Scrap/ }));
  await inspector.type(page.getByLabel('Reason'), 'Bent past what may be straightened.');
  await inspector.looks('nonconformance');
  await inspector.press(page.getByRole('button', { name: 'Scrap 1' }));
  await inspector.press(page.getByRole('dialog').getByRole('button', { name: 'Scrap 1' }));
  await inspector.sees(page.getByText('is closed').first());
}

async function refuseInvoice(office: Person, batchId: string): Promise<void> {
  const { page } = office;
  const invoices = await page.request.get(`/api/invoices?batchId=${batchId}`);
  const { rows } = (await invoices.json()) as { rows: { id: string }[] };
  await office.goTo(`/invoices/${rows[0]?.id ?? ''}?enter=1`);
  await office.type(page.getByLabel('Number of the invoice'), `SF-${String(Date.now()).slice(-6)}`);
  await office.type(page.getByLabel('Dated'), dayIn(0));
  await office.type(page.getByLabel('Total it asks for'), '30.00');
  await office.press(page.getByRole('button', { name: 'Hold it against the order' }));
  await office.press(page.getByRole('button', { name: 'Refuse invoice' }));
  await office.looks('invoice-refuse');
  await office.type(page.getByLabel('Reason'), 'One of the six came back bent and is not owed.');
  await office.press(page.getByRole('dialog').getByRole('button', { name: 'Refuse invoice' }));
  await office.sees(page.getByText('Refused:'));
}
