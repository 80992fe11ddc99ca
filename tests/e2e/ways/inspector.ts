import { DEMO_PASSWORD } from '@/db/seed/sign-ins';

import { dayIn } from '../support/day-in';
import { expect, type Person } from '../support/journey';

/** Types the number of the batch, as a scanner does, and counts all of it in as good. */
export async function countIn(
  inspector: Person,
  { number, pieces }: { number: string; pieces: number },
): Promise<void> {
  const { page } = inspector;
  await inspector.goTo('/receive');
  await inspector.type(page.getByRole('main').getByRole('textbox').first(), number);
  await inspector.key('Enter');
  await page.waitForURL(/\/receive$/);
  await inspector.press(page.getByRole('button', { name: `All ${pieces} are here and good` }));
  await inspector.looks('receive');
  await inspector.press(page.getByRole('button', { name: new RegExp(`^Count in ${pieces}`) }));
  await page.waitForURL(/\/batches\/[0-9a-f-]{36}$/);
}

/** Holds the certificate against what must be proved, by keyboard, and signs for all pieces. */
export async function prove(
  inspector: Person,
  { batchId, pieces }: { batchId: string; pieces: number },
): Promise<void> {
  const { page } = inspector;
  const certificates = await page.request.get(`/api/certificates?batchId=${batchId}`);
  const { rows } = (await certificates.json()) as { rows: { id: string }[] };
  await inspector.goTo(`/certificates/${rows[0]?.id ?? ''}`);
  await inspector.type(page.getByLabel('Certificate number', { exact: true }), `SF-${String(Date.now()).slice(-6)}`);
  await inspector.type(page.getByLabel('Date on it', { exact: true }), dayIn(0));
  await inspector.key('Tab');
  const open = page.locator('[id^="row-"]');
  await inspector.press(open.first());
  for (let left = await open.count(); left > 0; left--) await inspector.key('Enter');
  const sign = page.getByRole('button', { name: `Sign for ${pieces} pieces` });
  await inspector.sees(sign);
  await inspector.looks('prove');
  await inspector.press(sign);
  await inspector.type(page.getByLabel(/^Password of/), DEMO_PASSWORD);
  const form = page.getByRole('form', { name: 'Sign' });
  await inspector.press(form.getByRole('button', { name: `Sign for ${pieces}` }));
  await inspector.sees(page.getByText(`Signed for ${pieces}.`).first());
}

/** Through the gate into a place of the store. */
export async function release(
  inspector: Person,
  { batchId, pieces }: { batchId: string; pieces: number },
): Promise<void> {
  const { page } = inspector;
  const says = `Release ${pieces} to stock`;
  await inspector.goTo(`/batches/${batchId}/release`);
  await inspector.choose(page.getByLabel('Place of line 1'), { index: 1 });
  await inspector.looks('release');
  await inspector.press(page.getByRole('button', { name: says }));
  await inspector.press(page.getByRole('dialog').getByRole('button', { name: says }));
  await expect
    .poll(async () => {
      const gate = await page.request.get(`/api/batches/${batchId}/gate`);
      return ((await gate.json()) as { stage: string }).stage;
    })
    .toBe('stocked');
}
