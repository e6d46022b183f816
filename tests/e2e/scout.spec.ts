import { expect, test } from '@playwright/test';
import { collectComplaints, expectReadable, signInAs } from './support/walk';

test('the scout types a paper sheet in, is asked about what is odd, and loses nothing', async ({ page }, { project }) => {
  const complaints = collectComplaints(page);
  await signInAs(page, 'scout', 'Pell');
  await expectReadable(page);
  // Each project writes into a row sample of its own.
  await page.getByRole('link', { name: project.name === 'phone' ? 'C5' : 'C6', exact: true }).click();
  const plants = page.getByLabel('Plants', { exact: true });
  const save = page.getByRole('button', { name: 'Save 1 count' });

  await page.getByLabel('Date', { exact: true }).first().fill('2026-04-20');
  await plants.fill('12');
  await save.click();
  await expect(page.getByText(/before planting/).first()).toBeVisible();
  await expect(plants).toHaveValue('12');

  await page.getByLabel('Date', { exact: true }).first().fill('2026-05-26');
  await plants.fill('twelve');
  await save.click();
  await expect(page.getByText(/whole number/).first()).toBeVisible();

  await page.reload();
  await expect(plants).toHaveValue('twelve');

  await plants.fill('3');
  await save.click();
  await expect(page.getByText(/Have plants gone/).first()).toBeVisible();
  await page.getByRole('button', { name: /^Yes/ }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('3 plants up on day 24');
  await expectReadable(page);

  await page.goto(page.url().replace(/\/count\/.*/, '/compare'));
  await expect(page.getByRole('heading', { name: 'There is nothing at this address' })).toBeVisible();
  expect(complaints).toEqual([]);
});

test('a bad line of a file is named, and nothing of the file is taken', async ({ page }) => {
  await signInAs(page, 'scout', 'Pell');
  await page.getByRole('link', { name: 'All counts of this planting' }).first().click();
  await page.getByRole('link', { name: 'Take counts in by file' }).click();
  await page.getByLabel(/paste/i).first().fill('row_sample,date,time,so_far,doubtful,marker\nS1-1,2026-05-25,09:00,31,,\nNOWHERE,2026-05-25,09:00,30,,\n');
  await expect(page.getByRole('main').getByText(/NOWHERE/).last()).toBeVisible();
  await expectReadable(page);
});
