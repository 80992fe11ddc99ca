import { test } from './support/journey';
import { makeAndVerifyDossier } from './ways/dossier';
import { countIn, prove, release } from './ways/inspector';
import { buildAndDispatch, fitToAssembly, makePartAndLot } from './ways/lead';
import { enterAndPay } from './ways/office';
import { answerFromMail } from './ways/processor';

const PIECES = 6;
const PRICE = '30.00';

/**
 * The whole way of one batch, by four people with browsers of their own, at a desk, a tablet and a phone: made, built,
 * dispatched, answered from the mailed link, counted in, proved by keyboard, signed, paid, released and fitted; then the
 * dossier, whose manifest is checked file by file. What each way cost the person is printed.
 */
for (const width of [1440, 820, 390]) {
  test(`one batch goes out, comes back, is proved, paid, stocked and fitted, and its dossier verifies, at ${width} px`, async ({
    person,
  }) => {
    test.setTimeout(600_000);
    const work = { partNumber: `MC-9${String(Date.now()).slice(-6)}`, pieces: PIECES };

    const lead = await person('Lead', width);
    await lead.signIn('liv@merganser.test');
    const lotId = await makePartAndLot(lead, work);
    const batch = await buildAndDispatch(lead, work);
    lead.report('from a new drawing to a dispatched batch');

    const processor = await person('Processor', width);
    await answerFromMail(processor, { desk: 'desk@sallowfinch.test', number: batch.number, pieces: PIECES });
    processor.report('open the link, count, promise, send the papers');

    const inspector = await person('Inspector', width);
    await inspector.signIn('amos@merganser.test');
    await countIn(inspector, { number: batch.number, pieces: PIECES });
    inspector.report('count in');
    await prove(inspector, { batchId: batch.id, pieces: PIECES });
    inspector.report('prove and sign');

    const office = await person('Office', width);
    await office.signIn('petra@merganser.test');
    await enterAndPay(office, { batchId: batch.id, amount: PRICE });
    office.report('enter, approve and pay');

    await release(inspector, { batchId: batch.id, pieces: PIECES });
    inspector.report('release to stock');
    await fitToAssembly(lead, work);
    lead.report('fit to an assembly');
    await makeAndVerifyDossier(inspector, lotId);
    inspector.report('make the dossier');
  });
}
