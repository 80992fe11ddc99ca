import { dayIn } from './support/day-in';
import { expect, test, type Person } from './support/journey';

const SOLUTION = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  classType: 'trade checks',
} as const;
const CADMIUM = {
  process: 'cadmium_plate',
  specification: 'AMS-QQ-P-416',
  specificationRevision: 'F',
  classType: 'type II class 2',
} as const;

interface Metal {
  alloy: string;
  form?: string;
  clad?: boolean;
  madeCondition: string;
  endCondition: string;
}

/** The rules of the trade on the page of a batch, before it leaves. */
test('a mixed batch takes two loads, a clad lot is on its last treatment, steel without a bake stays here', async ({
  person,
}) => {
  test.setTimeout(300_000);
  const lead = await person('Lead');
  await lead.signIn('liv@merganser.test');

  const mixed = await batchOf(lead, SOLUTION, [
    { alloy: '2024', madeCondition: 'O', endCondition: 'T42' },
    { alloy: '7075', madeCondition: 'O', endCondition: 'T62' },
  ]);
  await lead.goTo(`/batches/${mixed}`);
  await lead.sees(lead.page.getByText('It takes 2 furnace loads.'));
  await lead.sees(lead.page.getByText(/line 1 and line 2 are kept apart/));
  await lead.looks('trade-two-loads');

  const clad = await batchOf(lead, SOLUTION, [
    { alloy: '2024', clad: true, madeCondition: 'T3', endCondition: 'T42' },
  ]);
  await lead.goTo(`/batches/${clad}`);
  await lead.sees(lead.page.getByText(/is on its last solution treatment/));

  const steel = await batchOf(lead, CADMIUM, [
    { alloy: '4340', form: 'bar', madeCondition: 'annealed', endCondition: 'HRC 40 to 44' },
  ]);
  await lead.goTo(`/batches/${steel}`);
  await lead.sees(lead.page.getByText(/is baked after plating/));
  await lead.looks('trade-no-bake');
  const refused = await lead.page.request.post(`/api/batches/${steel}/dispatch`, {
    data: { version: await versionOf(lead, steel) },
  });
  expect(refused.status()).toBe(409);
});

/** A shop's own edition of a table, from a spreadsheet to the check that cites it. */
test('a quench delay from the own procedure is entered, cited by the batch, and withdrawn again', async ({
  person,
}) => {
  test.setTimeout(300_000);
  const owner = await person('Owner');
  const { page } = owner;
  await owner.signIn('owner@larkspur.test');

  await owner.goTo('/settings/tables');
  await owner.press(page.getByRole('link', { name: 'Maximum quench delay of wrought aluminium' }));
  const chosen = page.getByLabel(/CSV file of the table|Choose the file again/);
  await owner.gives(chosen, 'delays.csv', Buffer.from('from (in),max (s)\r\nthin,6\r\n'));
  await owner.sees(page.getByText('1 of 1 row is wrong.'));
  await owner.sees(page.getByText(/thin is not what stands here/));
  await owner.gives(chosen, 'delays.csv', Buffer.from('from (in),max (s)\r\n0,4\r\n0.032,6\r\n'));
  await owner.sees(page.getByText(/2 rows, nothing is wrong/));
  await owner.type(page.getByLabel('Specification', { exact: true }), 'Own procedure HT-12');
  await owner.type(page.getByLabel('Edition', { exact: true }), 'issue 3');
  await owner.type(page.getByLabel('Clause', { exact: true }), 'Table 2');
  await owner.press(page.getByRole('button', { name: 'Enter 2 rows' }));
  await owner.sees(page.getByText('Your own: Own procedure HT-12, issue 3, Table 2.'));
  await owner.looks('own-table');

  const batch = await batchOf(owner, SOLUTION, [{ alloy: '2024', madeCondition: 'O', endCondition: 'T42' }]);
  await owner.goTo(`/batches/${batch}`);
  await owner.sees(page.getByText(/Into the quench within 6 s/));
  await owner.sees(page.getByText(/Own procedure HT-12, issue 3, Table 2 \(entered by/).first());

  await owner.goTo('/settings/tables/quench-delays');
  await owner.press(page.getByRole('button', { name: 'Withdraw your edition' }));
  await owner.press(page.getByRole('button', { name: 'Withdraw the edition' }));
  await owner.sees(page.getByText(/^Tables of the trade\. As published/));
  await owner.goTo(`/batches/${batch}`);
  await owner.sees(page.getByText(/Into the quench within 10 s/));
});

async function ask(lead: Person, path: string, data: object): Promise<{ id: string; version: number }> {
  const answer = await lead.page.request.post(`/api${path}`, { data });
  expect(answer.ok(), await answer.text()).toBe(true);
  return (await answer.json()) as { id: string; version: number };
}

async function versionOf(lead: Person, batchId: string): Promise<number> {
  const answer = await lead.page.request.get(`/api/batches/${batchId}`);
  return ((await answer.json()) as { version: number }).version;
}

/** A batch with a lot of its own part of each metal. */
async function batchOf(
  lead: Person,
  step: typeof SOLUTION | typeof CADMIUM,
  metals: readonly Metal[],
): Promise<string> {
  const lines = [];
  for (const metal of metals) {
    const { id: partId } = await ask(lead, '/parts', partOf(step, metal));
    const lot = { partId, heat: 'H-1', pieces: 4, madeOn: dayIn(0) };
    const { id: lotId } = await ask(lead, '/lots', lot);
    const part = await lead.page.request.get(`/api/parts/${partId}`);
    const { route } = (await part.json()) as { route: { id: string }[] };
    lines.push({ lotId, stepId: route[0]?.id, pieces: 4 });
  }
  const listed = await lead.page.request.get(
    `/api/batches/step-processors?process=${step.process}&specification=${encodeURIComponent(step.specification)}`,
  );
  const { processors } = (await listed.json()) as { processors: { processorId: string }[] };
  const { id } = await ask(lead, '/batches', { processorId: processors[0]?.processorId, lines });
  return id;
}

let parts = 0;

function partOf(step: typeof SOLUTION | typeof CADMIUM, metal: Metal) {
  parts += 1;
  const { madeCondition, endCondition } = metal;
  const isTreated = step.process === 'solution_heat_treat_and_age';
  const conditions = isTreated
    ? { conditionBefore: madeCondition, targetCondition: endCondition }
    : { conditionBefore: '', targetCondition: '' };
  return {
    number: `MC-6${String(Date.now()).slice(-6)}-${parts}`,
    revision: 'A',
    name: 'Trial piece',
    form: 'sheet',
    clad: false,
    thickness: '0.040 in',
    length: '4 in',
    width: '3 in',
    height: '',
    mass: '',
    area: '',
    serialised: false,
    note: '',
    drawingFileId: null,
    ...metal,
    route: [{ ...step, ...conditions, toProve: [], note: '' }],
  };
}
