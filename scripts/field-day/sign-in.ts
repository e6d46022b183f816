import type { Page } from '@playwright/test';
import { password } from '../chaos/scene';
import type { PhoneBrowser } from './phone-browser';
import type { FieldScene } from './scene';

export async function typePassword(page: Page, scene: FieldScene): Promise<void> {
  await page.getByLabel('E-mail').fill(scene.scout.email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
}

/** Signs the scout in where there is a network, and waits until page and rows are on the phone. */
export async function signIn(phone: PhoneBrowser, scene: FieldScene): Promise<void> {
  const page = await phone.open('/sign-in?to=round');
  await typePassword(page, scene);
  await page.getByRole('heading', { level: 1, name: /rows? due today|Nothing is due/ }).waitFor();
  // The worker has the page before the network goes.
  await page.evaluate(() => navigator.serviceWorker.ready.then((ready) => new Promise((done) => (ready.active?.state === 'activated' ? done(true) : ready.active?.addEventListener('statechange', () => done(true))))));
}
