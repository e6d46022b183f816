import { expect, test, type Page } from '@playwright/test';
import { collectComplaints, expectReadable } from './support/walk';

// One link makes the first owner once, so the whole of a newcomer's day is one walk, at a desk.

const passphrase = 'rows come up in order';

const seasonStep = (page: Page, name: string) =>
  page.getByRole('navigation', { name: 'The season of this planting' }).getByRole('link', { name: new RegExp(`^${name}`) });

async function addRowSample(page: Page, length: string, ends: string, howMany: string) {
  const form = page.getByRole('region', { name: 'Row samples' }).or(page.locator('section', { hasText: 'Row samples' })).last().locator('form').last();
  await form.getByLabel('How many').selectOption(howMany);
  await form.getByLabel(/^Length/).fill(length);
  await form.getByLabel('The tape runs').selectOption({ label: ends });
  await form.getByRole('button', { name: 'Add row samples' }).click();
}

async function addPlanting(page: Page, facts: { on: string; seeds: string; stand: string; yield: string }) {
  await page.getByLabel('Planted on', { exact: true }).fill(facts.on);
  await page.getByLabel(/^Row spacing/).fill('30');
  await page.getByLabel(/^Seeding rate/).fill(facts.seeds);
  await page.getByLabel(/^Intended final stand/).fill(facts.stand);
  await page.getByLabel(/^Yield at a full stand/).fill(facts.yield);
  await page.getByRole('button', { name: 'Add planting' }).click();
  await expect(page).toHaveURL(/\/plan$/);
}

test('a newcomer gets from the one-time link to the published results', async ({ page, browser }) => {
  test.setTimeout(240_000);
  const complaints = collectComplaints(page);
  const address = process.env.ROWRISE_EMPTY_URL ?? '';

  await test.step('the link asks for what it needs, and makes the first owner', async () => {
    await page.goto(process.env.ROWRISE_FIRST_OWNER_LINK ?? '');
    await page.getByLabel('Name of the account').fill('Test Fields');
    await page.getByLabel('Your name').fill('Nell Tester');
    await page.getByLabel('E-mail').fill('nell@fields.example');
    await page.getByLabel(/^New password/).fill('too short');
    await page.getByLabel('Time zone').fill('America/Chicago');
    await page.getByRole('button', { name: 'Go on' }).click();
    await expect(page.getByRole('main').getByRole('alert')).toContainText('at least 15 characters');
    await page.getByLabel(/^New password/).fill(passphrase);
    await page.getByRole('button', { name: 'Go on' }).click();
    await expect(page.getByText('Begin with a farm')).toBeVisible();
    await expectReadable(page);
  });

  await test.step('a used link opens nothing', async () => {
    const other = await browser.newContext();
    const elsewhere = await other.newPage();
    await elsewhere.goto(process.env.ROWRISE_FIRST_OWNER_LINK ?? '');
    await expect(elsewhere.getByRole('heading', { name: 'This link does not open anything' })).toBeVisible();
    await other.close();
  });

  await test.step('farm, field and planting', async () => {
    await page.getByRole('link', { name: 'To farms and fields' }).click();
    await page.getByLabel('Farm name').fill('Plain Farm');
    await page.getByRole('button', { name: 'Add farm' }).click();
    await page.getByRole('link', { name: 'Plain Farm' }).click();
    await page.getByLabel('Field name').fill('Square forty');
    await page.getByLabel(/^Area/).fill('40,5 acres');
    await page.getByRole('button', { name: 'Add field' }).click();
    await page.getByRole('link', { name: 'Square forty' }).click();
    await page.getByRole('button', { name: 'Add planting' }).click();
    await expect(page.getByRole('main').getByRole('alert')).toContainText('row spacing');
    await addPlanting(page, { on: '2026-04-30', seeds: '34,000', stand: '31,000', yield: '200' });
    await expectReadable(page);
  });

  await test.step('31 plants in 17 ft 5 in are about 31,000 by the formula', async () => {
    await addRowSample(page, '17 ft 5 in', 'from a mark to a mark', '1');
    await page.getByRole('link', { name: 'R1', exact: true }).click();
    await page.getByLabel('Date', { exact: true }).first().fill('2026-05-20');
    await page.getByLabel('Plants', { exact: true }).fill('31');
    await page.getByRole('button', { name: 'Save 1 count' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('31 plants up on day 20');
    await seasonStep(page, 'Scores').click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('31,0');
  });

  await test.step('the printed tape readings give the printed figures', async () => {
    await seasonStep(page, 'Plan').click();
    await page.getByText('Free in the field').click();
    await addRowSample(page, '68 in', 'from a plant to a plant', '1');
    await page.getByRole('link', { name: 'R2', exact: true }).click();
    await page.getByLabel('Date', { exact: true }).first().fill('2026-05-20');
    await page.getByLabel('Plants', { exact: true }).fill('11');
    await page.getByRole('button', { name: 'Save 1 count' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('11 plants');
    await page.getByRole('button', { name: 'Type in a tape sheet' }).click();
    await page.getByText('Paste a line of readings').click();
    await page.getByLabel(/^Readings/).fill('0 2 17 33 38 39 44 52 55 60 68');
    await page.getByRole('button', { name: 'Add these places' }).click();
    await page.getByRole('button', { name: 'Save the tape sheet' }).click();
    await expect(page.getByText('6.8 in').first()).toBeVisible();
    await expect(page.getByText('5.1 in').first()).toBeVisible();
    await seasonStep(page, 'Scores').click();
    await page.getByRole('navigation').getByRole('link', { name: /row samples/i }).click();
    await expect(page.getByText('30,748').first()).toBeVisible();
  });

  await test.step('somebody is invited and comes in by the link', async () => {
    await page.getByRole('link', { name: 'People' }).click();
    await page.getByLabel('Name', { exact: true }).fill('Sam Scout');
    await page.getByLabel('E-mail').fill('sam@fields.example');
    await page.getByLabel('Plain Farm').check();
    await page.getByRole('button', { name: 'Make the link' }).click();
    const link = await page.getByText(/\/link\//).textContent();
    const other = await browser.newContext();
    const scout = await other.newPage();
    await scout.goto(link ?? '');
    await scout.getByLabel(/^New password/).fill('a clicker and a tape');
    await scout.getByRole('button', { name: 'Go on' }).click();
    await expect(scout.getByRole('link', { name: 'R1', exact: true })).toBeVisible();
    await scout.goto(page.url());
    await expect(scout.getByRole('heading', { name: 'There is nothing at this address' })).toBeVisible();
    await other.close();
  });

  await test.step('planted 30 April, 20,000 plants, 200 bu: 92 %, 184 bu; 25 May at 30,000: 87 %: keep', async () => {
    await page.goto(`${address}/`);
    await page.getByRole('link', { name: 'Farms' }).click();
    await page.getByRole('link', { name: 'Plain Farm' }).click();
    await page.getByRole('link', { name: 'Square forty' }).click();
    await addPlanting(page, { on: '2026-04-30', seeds: '34,000', stand: '31,000', yield: '200' });
    // 26 ft 1.632 in of a 30-inch row is 1.5/1000 acre: 30 plants are 20,000 an acre.
    await addRowSample(page, '26.136', 'from a mark to a mark', '2');
    for (const label of ['R1', 'R2']) {
      await page.getByRole('link', { name: label, exact: true }).first().click();
      await page.getByLabel('Date', { exact: true }).first().fill('2026-05-18');
      await page.getByLabel('Plants', { exact: true }).fill('30');
      await page.getByRole('button', { name: 'Save 1 count' }).click();
      await expect(page.getByRole('heading', { level: 1 })).toContainText('30 plants');
      await seasonStep(page, 'Plan').click();
    }
    await seasonStep(page, 'Decide').click();
    await page.getByLabel(/^Yield at full stand/).fill('200');
    await page.getByLabel('Price, $ a bushel').fill('4.00');
    await page.getByLabel('The day you could replant').fill('2026-05-25');
    await page.getByLabel(/^Stand after replanting/).fill('30,000');
    for (const amount of await page.getByLabel(/^Cost \d, \$ an acre/).all()) await amount.fill('10');
    await page.getByLabel('Extra drying, $ an acre').fill('0');
    await page.getByLabel('Insurance replant payment, $ an acre').fill('0');
    await page.getByLabel('Loss from gaps, %').fill('0');
    await page.getByLabel('Loss from late plants, %').fill('0');
    await page.getByLabel('Chance that it is poor as well, %').fill('0');
    await page.getByRole('button', { name: 'Save and answer' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('Keep this stand');
    await expect(page.getByText('92.0 %').first()).toBeVisible();
    await expect(page.getByText('184.0 bu/ac').first()).toBeVisible();
    await expect(page.getByText('87.0 %').first()).toBeVisible();
    await expectReadable(page);
  });

  expect(complaints).toEqual([]);
});
