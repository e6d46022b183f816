import { expect, test } from '@playwright/test';
import { collectComplaints, expectReadable, signInAs } from './support/walk';

test('the agronomist reads the trial from its plan to what it may claim', async ({ page }) => {
  const complaints = collectComplaints(page);
  await signInAs(page, 'agronomist');
  await expect(page.getByText('Demo, all invented.')).toBeVisible();
  await expectReadable(page);

  await page.getByRole('listitem').filter({ hasText: 'Larkspur Bottom' }).getByRole('link', { name: 'Plan' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('4 settings in 4 blocks');
  await expect(page.getByText('1 in 13,824')).toBeVisible();
  await expectReadable(page);

  await page.getByRole('link', { name: /^Compare/ }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('light down');
  await expect(page.getByText(/95.%/).first()).toBeVisible();
  await expect(page.locator('.recharts-surface').first()).toBeVisible();
  await expect(page.getByRole('img', { name: /plants in 17 ft 5 in/ }).first()).toBeVisible();
  await expectReadable(page);

  await page.getByRole('link', { name: /^Scores/ }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('plants per acre');
  await page.getByRole('button', { name: /Show where it comes from/ }).first().click();
  const opened = page.getByRole('dialog');
  await expect(opened.getByText('Source')).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(opened).toBeHidden();
  await expectReadable(page);

  await page.getByRole('link', { name: /^Decide/ }).click();
  await page.getByRole('link', { name: 'People' }).click();
  await expect(page.getByRole('button', { name: 'Make the link' })).toBeHidden();
  expect(complaints).toEqual([]);
});

test('anyone works the published examples out on the page of methods', async ({ page }) => {
  await page.goto('/methods');
  const main = page.getByRole('main');
  for (const published of ['17.5', '30,748', '6.8', '12.5', '93.2', '92']) {
    await expect(main.getByText(published).first()).toBeVisible();
  }
  await page.getByLabel(/^Highest of the day/).fill('49');
  await page.getByLabel(/^Lowest of the day/).fill('30');
  await expect(main.getByText(/^0(\.0)? /).first()).toBeVisible();
  await page.getByLabel(/^Highest of the day/).fill('hot');
  await expect(main.getByText(/as a number/).first()).toBeVisible();
  await expectReadable(page);
});
