import { expect, test, type Locator } from '@playwright/test';
import { demoId } from '@/db/demo/demo-id';
import { trialPlantingId } from '@/db/demo/trial-ids';
import { otherIdsOf } from '@/db/demo/write-other-organisation';
import { collectComplaints, expectReadable, signInAs } from './support/walk';

const org = demoId('quillfern');

/** What a screen reader is told of a field: that it is wrong, and why. */
async function expectErrorAt(field: Locator, sentence: RegExp) {
  await expect(field).toHaveAttribute('aria-invalid', 'true');
  await expect(field).toHaveAccessibleDescription(sentence);
}

test('a planting form names each wrong field, and keeps what was typed in all of them', async ({ page }) => {
  const complaints = collectComplaints(page);
  await signInAs(page, 'agronomist');
  await page.goto(`/o/${org}/plantings/${trialPlantingId}/plan`);
  await page.getByRole('button', { name: 'Change the planting' }).click();
  const typed: readonly [RegExp, string, RegExp][] = [
    [/^Planted on/, '2019-01-01', /./],
    [/^Row spacing/, 'thirty', /./],
    [/^Seeding rate/, '-34,000', /./],
    [/^Germination on the tag/, '195', /./],
    [/^Intended final stand/, '', /./],
    [/^Yield at a full stand/, '9999', /./],
    [/^Late after days/, 'soon', /./],
  ];
  for (const [label, value] of typed) await page.getByLabel(label).first().fill(value);
  await page.getByRole('button', { name: 'Save planting' }).click();
  await expect(page.getByRole('main').getByRole('alert')).toBeVisible();
  for (const [label, value, sentence] of typed.slice(1)) {
    await expect(page.getByLabel(label).first()).toHaveValue(value);
    await expectErrorAt(page.getByLabel(label).first(), sentence);
  }
  await expectReadable(page);
  expect(complaints).toEqual([]);
});

test('of two people who change the same setting the second is told, sees both, and loses nothing', async ({ browser }, { project }) => {
  // Each project changes a setting of its own, so that the two never meet each other.
  const name = project.name === 'phone' ? 'Raised' : 'Pinned above the soil';
  const [theirs, mine] = [`${name}: chains checked by the owner.`, `${name}: bearings checked by the agronomist.`];
  const pages = await Promise.all(['owner', 'agronomist'].map(async (role) => {
    const page = await (await browser.newContext()).newPage();
    await signInAs(page, role);
    await page.goto(`/o/${org}/settings`);
    await page.getByRole('button', { name: `Change ${name}` }).click();
    return page;
  }));
  const [first, second] = pages;
  if (!first || !second) throw new Error('Two people are needed.');
  await first.getByLabel(/^Note/).first().fill(theirs);
  await second.getByLabel(/^Note/).first().fill(mine);
  await first.getByRole('button', { name: 'Save setting' }).click();
  await expect(first.getByRole('paragraph').filter({ hasText: theirs })).toBeVisible();
  await second.getByRole('button', { name: 'Save setting' }).click();
  await expect(second.getByRole('main').getByRole('alert')).toContainText('Somebody else changed this');
  await expect(second.getByLabel(/^Note/).first()).toHaveValue(mine);
  await second.getByRole('button', { name: 'Show what stands now' }).click();
  await expect(second.getByText(theirs).first()).toBeVisible();
  await expect(second.getByLabel(/^Note/).first()).toHaveValue(mine);
  await second.getByRole('button', { name: 'Save setting' }).click();
  await expect(second.getByRole('paragraph').filter({ hasText: mine })).toBeVisible();
  await Promise.all(pages.map((page) => page.context().close()));
});

test('a link to another organisation’s planting shows what a link to nothing shows', async ({ page }) => {
  await signInAs(page, 'agronomist');
  for (const planting of [otherIdsOf({ key: 'marrowglass' }).plantingId, demoId('no such planting')]) {
    await page.goto(`/o/${org}/plantings/${planting}/compare`);
    await expect(page.getByRole('heading', { name: 'There is nothing at this address' })).toBeVisible();
  }
});

test('a tape sheet asks about two plants at one mark, and refuses a place beyond the row', async ({ page }, { project }) => {
  await signInAs(page, 'scout', 'Pell');
  await page.getByRole('link', { name: project.name === 'phone' ? 'C3' : 'C4', exact: true }).click();
  await page.getByRole('button', { name: 'Type in a tape sheet' }).click();
  await page.getByText('Paste a line of readings').click();
  await page.getByLabel(/^Readings/).fill('6 12 12 900');
  await page.getByRole('button', { name: 'Add these places' }).click();
  await page.getByRole('button', { name: 'Save the tape sheet' }).click();
  await expect(page.getByText(/outside the length|beyond the/i).first()).toBeVisible();
  await expectReadable(page);
});

test('a file with the wrong columns is refused, and says which are missing', async ({ page }) => {
  await signInAs(page, 'scout', 'Pell');
  await page.getByRole('link', { name: 'All counts of this planting' }).first().click();
  await page.getByRole('link', { name: 'Take counts in by file' }).click();
  await page.getByLabel(/paste/i).first().fill('peg,day,plants\nS1-1,2026-05-25,31\n');
  await expect(page.getByRole('main').getByText(/row_sample/).first()).toBeVisible();
  await expect(page.getByRole('main').getByText(/column/i).first()).toBeVisible();
});
