import { AxeBuilder } from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';
import { demoPeople } from './demo-people';

/** Signs one of the demo's invented people in, by role and the beginning of the name where a role has several. */
export async function signInAs(page: Page, role: string, nameBegins = ''): Promise<void> {
  const person = demoPeople().find((each) => each.role === role && each.name.startsWith(nameBegins));
  if (!person) throw new Error(`The demo has no ${role} ${nameBegins}.`);
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(person.email);
  await page.getByLabel('Password').fill(person.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(/\/o\/[0-9a-f-]{36}$/);
}

/** A page reads out cleanly and does not scroll sideways. */
export async function expectReadable(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa']).analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`)).toEqual([]);
  const [width, room] = await page.evaluate(() => [document.documentElement.scrollWidth, document.documentElement.clientWidth]);
  expect(width).toBeLessThanOrEqual(room ?? 0);
}

/** Fails a test in which a page complains, a refused script among the complaints. */
export function collectComplaints(page: Page): string[] {
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    // A refused form answers with its own status; the browser reports that on its own account.
    if (message.type() === 'error' && !/status of 4\d\d/.test(message.text())) complaints.push(message.text());
  });
  return complaints;
}
