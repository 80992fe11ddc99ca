import { expect, test, type Person } from './support/journey';
import { mailTo } from './support/inbox';
import { looksRight } from './support/look';
import { somePaper } from './support/papers';

const PIECES = '6';
const DESK = 'desk@sallowfinch.test';

/**
 * The whole way of one batch, by three people with browsers of their own: made, built, dispatched, answered from the
 * mailed link on a phone, counted in on a tablet, proved by keyboard and signed. What each way cost the person is printed.
 */
test('one batch goes out, is answered from the mailed link, comes back, is proved and signed for', async ({
  person,
}) => {
  test.setTimeout(300_000);
  const partNumber = `MC-9${String(Date.now()).slice(-6)}`;
  const lead = await person('Lead');
  await lead.signIn('liv@merganser.test');
  await makePartAndLot(lead, partNumber);
  const batch = await buildAndDispatch(lead, partNumber);
  lead.report('from a drawing to a dispatched batch');

  const processor = await person('Processor', 390);
  await answer(processor, batch.number);
  processor.report('open the link, acknowledge, promise, send the papers');

  const counter = await person('Inspector', 820);
  await counter.signIn('amos@merganser.test');
  await countIn(counter, batch.number);
  counter.report('count in');

  const inspector = await person('Inspector');
  await inspector.signIn('amos@merganser.test');
  await prove(inspector, batch.id);
  inspector.report('prove and sign');
});

async function makePartAndLot(lead: Person, partNumber: string): Promise<void> {
  const { page } = lead;
  await lead.goTo('/parts/new');
  await lead.type(page.getByLabel('Drawing number'), partNumber);
  await lead.type(page.getByLabel('Revision', { exact: true }), 'A');
  await lead.type(page.getByLabel('Name', { exact: true }), 'Cleat pad');
  await lead.type(page.getByLabel('Alloy'), '304');
  await page.getByLabel('Product form').selectOption('sheet');
  await lead.type(page.getByLabel('Thickness'), '0.063 in');
  await lead.type(page.getByLabel('Made in'), 'annealed');
  await lead.type(page.getByLabel('Must end in'), 'annealed');
  if ((await page.getByLabel('Process', { exact: true }).count()) === 0)
    await lead.press(page.getByRole('button', { name: 'Add a step' }));
  await page.getByLabel('Process', { exact: true }).selectOption('passivation');
  await lead.type(page.getByLabel('Specification', { exact: true }), 'AMS 2700');
  await lead.type(page.getByLabel('Its revision'), 'F');
  await lead.press(page.getByRole('button', { name: 'Add what step 1 must prove' }));
  await lead.type(page.getByLabel('Characteristic'), 'Copper sulfate test');
  await lead.type(page.getByLabel('Limit'), 'passed');
  await lead.press(page.getByRole('button', { name: 'Add the part' }));
  await lead.press(page.getByRole('link', { name: 'Add a lot of it' }));
  await lead.type(page.getByLabel('Heat', { exact: true }), 'C40117');
  await lead.type(page.getByLabel('Pieces', { exact: true }), PIECES);
  await lead.press(page.getByRole('button', { name: 'Add the lot' }));
  await page.waitForURL(/\/lots\/[0-9a-f-]{36}/);
}

async function buildAndDispatch(lead: Person, partNumber: string): Promise<{ id: string; number: string }> {
  const { page } = lead;
  await lead.goTo('/batches/new?process=passivation&specification=AMS+2700&specificationRevision=F');
  // Other lots may wait for the same step; only ours goes along.
  for (const row of await page
    .getByRole('row')
    .filter({ has: page.getByRole('checkbox') })
    .all()) {
    const box = row.getByRole('checkbox');
    const isOurs = (await row.textContent())?.includes(partNumber) ?? false;
    if ((await box.isChecked()) !== isOurs) await lead.press(box);
  }
  await lead.press(page.getByRole('radio', { name: /Sallow & Finch/ }));
  await lead.type(page.getByLabel('Wanted back'), dayIn(14));
  await lead.press(page.getByRole('button', { name: `Start it with ${PIECES} pc` }));
  await page.waitForURL(/\/batches\/[0-9a-f-]{36}$/);
  await lead.press(page.getByRole('button', { name: 'Change line 1' }));
  await lead.type(page.getByLabel('Price each'), '5.00');
  await lead.press(page.getByRole('button', { name: 'Save line 1' }));
  await lead.sees(page.getByText('30.00').first());
  await looksRight(page, 'batch-building-1440');
  await lead.press(page.getByRole('button', { name: 'Dispatch', exact: true }));
  await lead.press(page.getByRole('dialog').getByRole('button', { name: `Dispatch ${PIECES} pc` }));
  await lead.sees(page.getByText(/is dispatched/).first());
  const number = (await page.getByRole('heading', { level: 1 }).textContent())?.match(/B-\d+/)?.[0] ?? '';
  return { id: new URL(page.url()).pathname.split('/').at(-1) ?? '', number };
}

async function answer(processor: Person, number: string): Promise<void> {
  const { page } = processor;
  const mail = await mailTo(DESK, number);
  const link = mail.links.find((one) => one.includes('/b/')) ?? '';
  // A scanner that fetches the link first changes nothing for the person.
  expect((await page.request.get(link)).status()).toBe(200);
  await processor.goTo(new URL(link).pathname);
  await looksRight(page, 'processor-link-390');
  await processor.press(page.getByRole('button', { name: `Open ${number}` }));
  await page.waitForURL(/\/portal\/batches\//);
  await page
    .getByRole('group', { name: 'When will they be done' })
    .getByRole('button')
    .or(page.getByRole('group', { name: 'When will they be done' }).getByRole('radio'))
    .first()
    .click();
  await looksRight(page, 'processor-first-390');
  await processor.press(page.getByRole('button', { name: new RegExp(`^I have ${PIECES}`) }));
  await processor.sees(page.getByText(`You have ${PIECES} pieces`));
  await sendPaper(
    processor,
    'Certificate',
    await somePaper('Certificate of conformance', `${number} passivation, ${PIECES} pieces`),
  );
  await sendPaper(processor, 'Invoice', await somePaper('Invoice', `${number}, ${PIECES} pieces at 5.00`));
  await looksRight(page, 'processor-papers-390');
}

async function sendPaper(processor: Person, kind: string, content: Buffer): Promise<void> {
  const { page } = processor;
  await page.getByRole('group', { name: 'What do you send' }).getByText(kind, { exact: true }).click();
  await page
    .locator('input[type=file]')
    .first()
    .setInputFiles({ name: `${kind.toLowerCase()}.pdf`, mimeType: 'application/pdf', buffer: content });
  await processor.sees(
    page.getByRole('list', { name: 'Papers sent' }).getByText(`${kind.toLowerCase()}.pdf`),
  );
}

async function countIn(counter: Person, number: string): Promise<void> {
  const { page } = counter;
  await counter.goTo('/receive');
  await counter.type(page.getByRole('main').getByRole('textbox').first(), number);
  await counter.key('Enter');
  await page.waitForURL(/\/receive$/);
  await counter.press(page.getByRole('button', { name: `All ${PIECES} are here and good` }));
  await looksRight(page, 'receive-820');
  await counter.press(page.getByRole('button', { name: new RegExp(`^Count in ${PIECES}`) }));
  await page.waitForURL(/\/batches\/[0-9a-f-]{36}$/);
}

async function prove(inspector: Person, batchId: string): Promise<void> {
  const { page } = inspector;
  const { rows } = (await (await page.request.get(`/api/certificates?batchId=${batchId}`)).json()) as {
    rows: { id: string }[];
  };
  await inspector.goTo(`/certificates/${rows[0]?.id ?? ''}`);
  await inspector.type(page.getByLabel('Certificate number'), 'SF-40117');
  await inspector.type(page.getByLabel('Date on it'), dayIn(0));
  await page.keyboard.press('Tab');
  await inspector.press(page.locator('[id^="row-"]').first());
  for (let left = await page.locator('[id^="row-"]').count(); left > 0; left--) await inspector.key('Enter');
  await inspector.sees(page.getByRole('button', { name: `Sign for ${PIECES} pieces` }));
  await looksRight(page, 'prove-1440');
  await inspector.press(page.getByRole('button', { name: `Sign for ${PIECES} pieces` }));
  await inspector.type(page.getByLabel(/^Password of/), 'slipway-demo-1');
  await inspector.press(
    page.getByRole('form', { name: 'Sign' }).getByRole('button', { name: `Sign for ${PIECES}` }),
  );
  await inspector.sees(page.getByText(`Signed for ${PIECES}.`).first());
}

const dayIn = (days: number): string =>
  new Date(Date.now() + days * 24 * 3600 * 1000).toISOString().slice(0, 10);
