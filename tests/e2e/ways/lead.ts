import { dayIn } from '../support/day-in';
import { idIn, type Person } from '../support/journey';

export interface Work {
  partNumber: string;
  pieces: number;
}

/** A part that is passivated outside, and a first lot of it. Ends on the page of the lot; its id comes back. */
export async function makePartAndLot(lead: Person, { partNumber, pieces }: Work): Promise<string> {
  const { page } = lead;
  await lead.goTo('/parts/new');
  await lead.type(page.getByLabel('Drawing number'), partNumber);
  await lead.type(page.getByLabel('Revision', { exact: true }), 'A');
  await lead.type(page.getByLabel('Name', { exact: true }), 'Cleat pad');
  await lead.type(page.getByLabel('Alloy'), '304');
  await lead.choose(page.getByLabel('Product form'), 'sheet');
  await lead.type(page.getByLabel('Thickness'), '0.063 in');
  await lead.type(page.getByLabel('Made in'), 'annealed');
  await lead.type(page.getByLabel('Must end in'), 'annealed');
  const process = page.getByLabel('Process', { exact: true });
  if ((await process.count()) === 0) await lead.press(page.getByRole('button', { name: 'Add a step' }));
  await lead.choose(process, 'passivation');
  await lead.type(page.getByLabel('Specification', { exact: true }), 'AMS 2700');
  await lead.type(page.getByLabel('Its revision'), 'F');
  await lead.press(page.getByRole('button', { name: 'Add what step 1 must prove' }));
  await lead.type(page.getByLabel('Characteristic'), 'Copper sulfate test');
  await lead.type(page.getByLabel('Limit'), 'passed');
  await lead.looks('part-new');
  await lead.press(page.getByRole('button', { name: 'Add the part' }));
  await lead.press(page.getByRole('link', { name: 'Add a lot of it' }));
  await lead.type(page.getByLabel('Heat', { exact: true }), 'C40117');
  await lead.type(page.getByLabel('Pieces', { exact: true }), String(pieces));
  await lead.press(page.getByRole('button', { name: 'Add the lot' }));
  await page.waitForURL(/\/lots\/[0-9a-f-]{36}/);
  return idIn(page.url());
}

/** Builds a batch of that part alone, prices it, reads the checks and lets it go. */
export async function buildAndDispatch(
  lead: Person,
  { partNumber, pieces }: Work,
): Promise<{ id: string; number: string }> {
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
  await lead.press(page.getByRole('button', { name: `Start it with ${pieces} pc` }));
  await page.waitForURL(/\/batches\/[0-9a-f-]{36}$/);
  await lead.press(page.getByRole('button', { name: 'Change line 1' }));
  await lead.type(page.getByLabel('Price each'), '5.00');
  await lead.press(page.getByRole('button', { name: 'Save line 1' }));
  await lead.sees(page.getByText('30.00').first());
  await lead.looks('batch-building');
  await lead.press(page.getByRole('button', { name: 'Dispatch', exact: true }));
  await lead.press(page.getByRole('dialog').getByRole('button', { name: `Dispatch ${pieces} pc` }));
  await lead.sees(page.getByText(/is dispatched/).first());
  const number = (await page.getByRole('heading', { level: 1 }).textContent())?.match(/B-\d+/)?.[0] ?? '';
  return { id: idIn(page.url()), number };
}

/** An assembly that needs the part; the pieces in stock are fitted to it, one place after the other. */
export async function fitToAssembly(lead: Person, { partNumber, pieces }: Work): Promise<void> {
  const { page } = lead;
  await lead.goTo('/assemblies/new');
  await lead.type(page.getByLabel('Name', { exact: true }), `Mooring kit ${partNumber}`);
  await lead.type(page.getByLabel('Part 1'), partNumber);
  await lead.type(page.getByLabel('Pieces', { exact: true }).first(), String(pieces));
  await lead.press(page.getByRole('button', { name: 'Add the assembly' }));
  await lead.press(page.getByRole('button', { name: `Fit ${partNumber}` }));
  await lead.press(page.getByRole('button', { name: new RegExp(`^Fit ${pieces} to Mooring kit`) }));
  await lead.sees(page.getByText('all fitted'));
  await lead.looks('assembly');
}
