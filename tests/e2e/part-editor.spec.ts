import { expect, test } from './support/journey';

test('the part editor refuses T3 to a heat treater', async ({ person }) => {
  test.setTimeout(180_000);
  const lead = await person('Lead');
  const { page } = lead;
  await lead.signIn('liv@merganser.test');
  await lead.goTo('/parts/new');
  await lead.type(page.getByLabel('Alloy'), '2024');
  await lead.choose(page.getByLabel('Product form'), 'sheet');
  await lead.type(page.getByLabel('Made in'), 'O');
  await lead.type(page.getByLabel('Must end in'), 'T3');
  await lead.sees(page.getByText(/Only a mill makes T3\. .*From O a heat treater makes T42\./));
  await lead.choose(page.getByLabel('Process', { exact: true }), 'solution, quench and age');
  await lead.type(page.getByLabel('To condition'), 'T3');
  await lead.sees(page.getByText(/Only a mill makes T3\. .*From O this step makes T42\./));
  await lead.looks('part-refuses-t3');

  await page.getByLabel('Must end in').fill('T42');
  await page.getByLabel('To condition').fill('T42');
  await expect(page.getByText(/Only a mill makes/)).toHaveCount(0);
  await lead.sees(page.getByText(/From O this step makes T42: solution heat treat, quench/));
  lead.report('type a condition that only a mill makes, then the one that can be made');
});
