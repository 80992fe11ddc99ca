import { makeForm } from '@/db/seed/papers';
import { recordOfSolution } from '@/db/seed/furnace-record';
import { DEMO_PASSWORD } from '@/db/seed/sign-ins';

import { dayIn } from './support/day-in';
import { expect, test, type Person } from './support/journey';
import { returnedBatch, type ReturnedBatch } from './support/returned-batch';

const PIECES = 12;
/** What a good paper of this batch states. */
const GOOD = {
  pieces: PIECES,
  states: ['Solution temperature: 920 °F', 'Soak time: 38 min', 'Quench delay: 7 s', 'Hardness: HRB 68'],
};

interface Stated {
  pieces: number;
  states: readonly string[];
  order?: string;
}

/** The certificate as the processor prints it, of a layout that the reader knows nothing of. */
const certificateOf = (batch: ReturnedBatch, { pieces, states, order }: Stated): Promise<Buffer> =>
  makeForm({
    title: 'Certificate of conformance',
    from: { name: 'Galena Thermal', address: 'Works Road, Tamarack Junction' },
    facts: [
      ['Certificate no.', `GT-${String(Date.now()).slice(-7)}`],
      ['Date', dayIn(0)],
      ['Purchase order', order ?? batch.orderNumber],
      ['Process', 'solution heat treat and age'],
      ['Specification', 'AMS 2770 rev R'],
      ['Condition', 'T42'],
    ],
    columns: ['Part number', 'Rev', 'Material', 'Lot', 'Qty accepted'],
    lines: [{ cells: [batch.partNumber, 'B', '2024', batch.lotNumber, String(pieces)] }],
    statements: [
      ...states,
      'We certify that the parts listed above were processed to the order and the specification named.',
    ],
    signed: { name: 'Runa Holt', role: 'Quality', day: dayIn(0) },
    at: new Date(),
  });

/** Adds a certificate at the batch and opens it, read. */
async function addAndOpen(inspector: Person, batch: ReturnedBatch, content: Buffer): Promise<void> {
  const { page } = inspector;
  await inspector.goTo(`/batches/${batch.id}`);
  await inspector.press(page.getByRole('button', { name: 'Add a certificate' }));
  await inspector.gives(page.locator('#certificates input[type=file]'), 'certificate.pdf', content);
  await inspector.press(page.getByRole('link', { name: 'Prove it' }));
  await page.waitForURL(/\/certificates\/[0-9a-f-]{36}$/);
  await inspector.sees(page.getByText(/Read by the machine in/));
}

test('a clean certificate is proved and signed in under twelve presses', async ({ person }) => {
  test.setTimeout(180_000);
  const { inspector, batch } = await twoPeople(person);
  await addAndOpen(inspector, batch, await certificateOf(batch, GOOD));
  inspector.report('add a certificate and wait until it is read');
  const { page } = inspector;
  await inspector.sees(page.getByText('Nothing stands against it.'));
  await inspector.looks('reading-clean');
  let presses = 0;
  const key = async (name: string) => {
    presses += 1;
    await inspector.key(name);
  };
  await key('w');
  const sign = page.getByRole('button', { name: `Sign for ${PIECES} pieces` });
  await expect(sign).not.toHaveAttribute('aria-disabled', 'true');
  await sign.focus();
  await key('Enter');
  // The password is a word of its own, not a press for each letter.
  await page.keyboard.type(DEMO_PASSWORD);
  await key('Enter');
  await inspector.sees(page.getByText(`Signed for ${PIECES}.`).first());
  expect(presses).toBeLessThan(12);
  inspector.report(`prove and sign what was read, ${presses} presses and the password`);
});

test('three things planted in a certificate are found, each once', async ({ person }) => {
  test.setTimeout(180_000);
  const { inspector, batch } = await twoPeople(person);
  const bad = {
    pieces: PIECES,
    order: 'MC-9999',
    states: ['Solution temperature: 920 °F', 'Soak time: 12 min', 'Quench delay: 14 s', 'Hardness: HRB 68'],
  };
  await addAndOpen(inspector, batch, await certificateOf(batch, bad));
  const { page } = inspector;
  const against = page.getByRole('list', { name: 'What stands against it' });
  await expect(against.getByRole('listitem')).toHaveCount(3);
  for (const says of [/MC-9999/, /12 min/, /14 s/]) await expect(against.getByText(says)).toHaveCount(1);
  await inspector.looks('reading-three-findings');
  // Confirming what was read well leaves these three to the person.
  await inspector.key('w');
  await expect(page.getByRole('row', { name: /Hardness/ }).getByText('decided')).toBeVisible();
  await expect(page.getByRole('row', { name: /Quench delay/ }).getByText('to confirm')).toBeVisible();
});

test('a quantity split over two certificates is covered by both together', async ({ person }) => {
  test.setTimeout(240_000);
  const { inspector, batch } = await twoPeople(person);
  const { page } = inspector;
  await addAndOpen(inspector, batch, await certificateOf(batch, { ...GOOD, pieces: 5 }));
  await inspector.sees(page.getByText(/short|balance/i).first());
  await signFor(inspector, 5);
  await addAndOpen(inspector, batch, await certificateOf(batch, { ...GOOD, pieces: PIECES - 5 }));
  await signFor(inspector, PIECES - 5);
  await inspector.goTo(`/batches/${batch.id}`);
  await inspector.sees(page.getByText('proved').first());
});

test('a chart whose soak is short is told so', async ({ person }) => {
  test.setTimeout(180_000);
  const { inspector, batch } = await twoPeople(person);
  const processor = await person('Processor');
  await processor.signIn('desk@galena-thermal.test');
  await processor.goTo(`/portal/batches/${batch.id}`);
  const record = recordOfSolution({ endedAt: new Date(), soakedMin: 4 });
  await processor.press(
    processor.page.getByRole('group', { name: 'What do you send' }).getByText('Chart', { exact: true }),
  );
  await processor.gives(processor.page.locator('input[type=file]').first(), 'load-a.csv', record);
  await processor.sees(processor.page.getByRole('list', { name: 'Papers sent' }).getByText('load-a.csv'));
  const { page } = inspector;
  await addAndOpen(inspector, batch, await certificateOf(batch, GOOD));
  await inspector.press(page.getByRole('link', { name: 'Chart load-a.csv' }));
  await page.waitForURL(/\/charts\//);
  const soak = page.getByRole('row', { name: /^Soak/ });
  await inspector.sees(soak.getByText('does not meet'));
  await expect(
    page.getByRole('row', { name: /^Quench delay/ }).getByText('meets', { exact: true }),
  ).toBeVisible();
  await inspector.looks('chart-short-soak');
});

async function signFor(inspector: Person, pieces: number): Promise<void> {
  const { page } = inspector;
  await inspector.key('w');
  await expect(page.getByRole('button', { name: /read well$/ })).toHaveCount(0);
  const sign = page.getByRole('button', { name: `Sign for ${pieces} pieces` });
  // What is left after one press is confirmed row by row.
  const open = page.getByRole('row').filter({ hasText: 'to confirm' });
  for (let left = await open.count(); left > 0; left--) {
    await inspector.press(open.first().getByRole('button').first());
    await inspector.key('Enter');
  }
  await inspector.press(sign);
  await inspector.type(page.getByLabel(/^Password of/), DEMO_PASSWORD);
  const form = page.getByRole('form', { name: 'Sign' });
  await inspector.press(form.getByRole('button', { name: `Sign for ${pieces}` }));
  await inspector.sees(page.getByText(`Signed for ${pieces}.`).first());
}

async function twoPeople(
  person: (name: string) => Promise<Person>,
): Promise<{ inspector: Person; batch: ReturnedBatch }> {
  const lead = await person('Lead');
  await lead.signIn('liv@merganser.test');
  const batch = await returnedBatch(lead, PIECES);
  const inspector = await person('Inspector');
  await inspector.signIn('amos@merganser.test');
  return { inspector, batch };
}
