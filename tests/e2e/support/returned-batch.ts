import { dayIn } from './day-in';
import { expect, type Person } from './journey';

const STEP = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  classType: 'natural age',
  conditionBefore: 'O',
  targetCondition: 'T42',
  note: '',
  ordering: {},
};
const prove = (characteristic: string, limit: string, unit = '') => ({
  characteristic,
  limit,
  unit,
  source: 'specification',
  sourceText: '',
});
const TO_PROVE = [
  prove('Solution temperature', '910 to 930', '°F'),
  prove('Soak', '25 or more', 'min'),
  prove('Quench delay', '10 or less', 's'),
  prove('Hardness', 'HRB 63 or more'),
];

export interface ReturnedBatch {
  id: string;
  number: string;
  orderNumber: string;
  partNumber: string;
  lotNumber: string;
}

/** One line of clad sheet that was solution treated and came back whole: by the API, for what comes after it is looked at. */
export async function returnedBatch(lead: Person, pieces: number): Promise<ReturnedBatch> {
  const partNumber = `MC-7${String(Date.now()).slice(-6)}`;
  const { id: partId } = await ask(lead, 'parts', {
    number: partNumber,
    revision: 'B',
    name: 'Step bracket',
    alloy: '2024',
    form: 'sheet',
    clad: false,
    thickness: '0.040 in',
    length: '4 in',
    width: '3 in',
    height: '',
    mass: '',
    area: '',
    madeCondition: 'O',
    endCondition: 'T42',
    serialised: false,
    note: '',
    drawingFileId: null,
    route: [{ ...STEP, toProve: TO_PROVE }],
  });
  const { id: lotId } = await ask(lead, 'lots', { partId, heat: 'H-7', pieces, madeOn: dayIn(0) });
  const part = await read<{ route: { id: string }[] }>(lead, `parts/${partId}`);
  const { processors } = await read<{ processors: { processorId: string; name: string }[] }>(
    lead,
    `batches/step-processors?process=${STEP.process}&specification=${encodeURIComponent(STEP.specification)}`,
  );
  const galena = processors.find(({ name }) => name === 'Galena Thermal') ?? processors[0];
  const { id } = await ask(lead, 'batches', {
    processorId: galena?.processorId,
    lines: [{ lotId, stepId: part.route[0]?.id, pieces }],
  });
  const version = async () => (await read<{ version: number }>(lead, `batches/${id}`)).version;
  await ask(lead, `batches/${id}`, { version: await version(), wantedBackOn: dayIn(14) }, 'patch');
  await ask(lead, `batches/${id}/dispatch`, { version: await version() });
  const { lines } = await read<{ lines: { id: string }[] }>(lead, `receipts/batches/${id}`);
  await ask(lead, 'receipts', {
    batchId: id,
    lines: lines.map((line) => ({ lineId: line.id, good: pieces })),
  });
  const batch = await read<{ number: string; orderNumber: string }>(lead, `batches/${id}`);
  const lot = await read<{ number: string }>(lead, `lots/${lotId}`);
  return { id, partNumber, lotNumber: lot.number, ...batch };
}

async function ask(
  { page }: Person,
  path: string,
  data: object,
  method: 'post' | 'patch' = 'post',
): Promise<{ id: string }> {
  const answer = await page.request[method](`/api/${path}`, { data });
  expect(answer.ok(), `${path}: ${await answer.text()}`).toBe(true);
  return (await answer.json()) as { id: string };
}

async function read<T>({ page }: Person, path: string): Promise<T> {
  const answer = await page.request.get(`/api/${path}`);
  expect(answer.ok(), `${path}: ${await answer.text()}`).toBe(true);
  return (await answer.json()) as T;
}
