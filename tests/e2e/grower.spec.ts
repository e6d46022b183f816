import { expect, test } from '@playwright/test';
import { collectComplaints, expectReadable, signInAs } from './support/walk';

test('the grower reads keep or replant in one sentence and opens what is behind it', async ({ page }) => {
  const complaints = collectComplaints(page);
  await signInAs(page, 'grower', 'Wilma');
  await expect(page.getByRole('heading', { level: 1 })).toContainText(/decision|No decision/);
  await page.getByRole('link', { name: 'Decide' }).first().click();
  await expect(page.getByText(/\$\d+ an acre/).first()).toBeVisible();
  await expect(page.getByText('Get your insurer’s consent before a stand is destroyed.').first()).toBeVisible();
  await page.getByRole('button', { name: /Show where it comes from/ }).first().click();
  await expect(page.getByRole('dialog')).toBeVisible();
  await page.keyboard.press('Escape');
  await page.getByRole('link', { name: /^Low ground/ }).click();
  await expect(page).toHaveURL(/zone=/);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expectReadable(page);
  expect(complaints).toEqual([]);
});

test('the grower signs, and the page says what was signed and on what', async ({ page }, { project }) => {
  // The two projects share the demo, and a decision is signed once: each signs for another part of the field.
  await signInAs(page, 'grower', 'Wilma');
  await page.getByRole('link', { name: 'Decide' }).first().click();
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await page.getByRole('link', { name: project.name === 'phone' ? /^High ground/ : /^Low ground/ }).click();
  await expect(page).toHaveURL(/zone=/);
  await page.getByRole('button', { name: 'Keep', exact: true }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Sign: keep' }).click();
  await expect(page.getByText('Type your name to sign.').first()).toBeVisible();
  await page.getByLabel('Your name').fill('Wilma Crookshank');
  await page.getByRole('dialog').getByRole('button', { name: 'Sign: keep' }).click();
  await expect(page.getByText(/Keep\. Signed by Wilma Crookshank on 26 May 2026/).first()).toBeVisible();
  await page.reload();
  await expect(page.getByText('Nothing it rested on has changed since.').first()).toBeVisible();
  await expectReadable(page);
});
