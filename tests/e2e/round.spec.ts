import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { AxeBuilder } from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';
import { demoPeople } from './support/demo-people';
import { collectComplaints } from './support/walk';

type Day = { organisation: { id: string }; plantings: { id: string; hasTrial: boolean; rows: { id: string; label: string }[] }[] };

/** Signs a scout in the way a phone does, and waits until the page and the rows are on the phone. */
async function takeAlong(page: Page, nameBegins: string): Promise<Day> {
  const person = demoPeople().find((each) => each.role === 'scout' && each.name.startsWith(nameBegins));
  await page.goto('/sign-in?to=round');
  await page.getByLabel('E-mail').fill(person?.email ?? '');
  await page.getByLabel('Password').fill(person?.password ?? '');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText(/due today/);
  await page.evaluate(() => navigator.serviceWorker.ready.then((ready) => new Promise((done) => (ready.active?.state === 'activated' ? done(true) : ready.active?.addEventListener('statechange', () => done(true))))));
  const org = new URL(page.url()).searchParams.get('org');
  return page.evaluate(async (path) => (await fetch(path)).json() as Promise<Day>, `/api/o/${org}/round-day`);
}

const address = (day: Day, at: string, planting?: string, row?: string) => `/round?org=${day.organisation.id}&at=${at}${planting ? `&planting=${planting}` : ''}${row ? `&row=${row}` : ''}`;

async function enter(page: Page): Promise<void> {
  const gate = page.getByRole('button', { name: 'Enter the field' });
  await expect(page.getByRole('heading', { level: 1 })).not.toHaveText(/^Opening/);
  if (await gate.isVisible()) await gate.click();
}

test('a scout counts without a network, undoes after moving on, loses nothing over a reload, and it arrives once', async ({ page, context }, { project }) => {
  const complaints = collectComplaints(page);
  const day = await takeAlong(page, 'Pell');
  const planting = day.plantings.find((each) => !each.hasTrial && each.rows.some((row) => row.label === 'C5'));
  const rows = planting?.rows.filter((row) => (project.name === 'phone' ? ['C1', 'C2'] : ['C3', 'C4']).includes(row.label)) ?? [];
  const [first] = rows;
  if (!planting || !first) throw new Error('The demo has no spot count rows.');
  await context.setOffline(true);
  await page.goto(address(day, 'count', planting.id, first.id));
  await enter(page);
  await expect(page.getByRole('heading', { level: 1, name: first.label, exact: true })).toBeVisible();
  await page.getByRole('button', { name: 'Looked, none new' }).click();
  await expect(page.getByRole('button', { name: /1 kept on this phone/ })).toBeVisible();

  await page.goto(address(day, 'kept'));
  await expect(page.getByRole('heading', { level: 1, name: '1 entry kept on this phone' })).toBeVisible();
  await page.goto(address(day, 'count', planting.id, rows[1]?.id));
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByRole('heading', { level: 1, name: first.label, exact: true })).toBeVisible();
  await expect(page.getByRole('button', { name: /All sent/ })).toBeVisible();
  await page.getByRole('button', { name: 'Looked, none new' }).click();
  await expect(page.getByRole('button', { name: /1 kept on this phone/ })).toBeVisible();

  await context.setOffline(false);
  await page.goto(address(day, 'kept'));
  await expect(page.getByRole('heading', { level: 1, name: 'Everything is sent' })).toBeVisible({ timeout: 30_000 });
  const counts = await page.evaluate(async ({ path, row }) => {
    const fresh = (await (await fetch(path)).json()) as { plantings: { rows: { id: string; counts: { visitedOn: string; countedAs: string }[] }[] }[] };
    return fresh.plantings.flatMap((each) => each.rows).find((each) => each.id === row)?.counts.filter((count) => count.countedAs === 'new' && count.visitedOn === '2026-05-26').length;
  }, { path: `/api/o/${day.organisation.id}/round-day`, row: first.id });
  expect(counts).toBe(1);
  expect(complaints.filter((each) => !/ERR_INTERNET_DISCONNECTED/.test(each))).toEqual([]);
});

test('ten presses a second all count, and a long press locks the screen', async ({ page }) => {
  const day = await takeAlong(page, 'Juno');
  const planting = day.plantings.find((each) => each.rows.length > 0);
  await page.goto(address(day, 'count', planting?.id, planting?.rows[0]?.id));
  await enter(page);
  const more = page.getByRole('button', { name: 'One more' });
  const shown = page.locator('output');
  await more.click();
  const begun = Number(await shown.textContent());
  // All within one second, from inside the page, as a clicker's thumb would.
  await more.evaluate((button) => new Promise<void>((done) => {
    let left = 10;
    const timer = setInterval(() => {
      (button as HTMLButtonElement).click();
      left -= 1;
      if (left === 0) { clearInterval(timer); done(); }
    }, 90);
  }));
  await expect(shown).toHaveText(String(begun + 10));
  const lock = page.getByRole('button', { name: 'Hold to lock the screen against wet glass' });
  await lock.click();
  await expect(page.getByRole('dialog', { name: 'Locked against wet glass' })).toHaveCount(0);
  await lock.click({ delay: 1_000 });
  await expect(page.getByRole('dialog', { name: 'Locked against wet glass' })).toBeVisible();
  await page.getByRole('button', { name: 'Hold here to unlock' }).click({ delay: 1_000 });
  await expect(page.getByRole('dialog', { name: 'Locked against wet glass' })).toHaveCount(0);
  await page.getByRole('button', { name: 'Clear' }).click();
});

test('a network that answers with its own page takes nothing from the phone', async ({ page }) => {
  const day = await takeAlong(page, 'Juno');
  const planting = day.plantings.find((each) => each.rows.length > 0);
  await page.route('**/api/**', (route) => route.fulfill({ status: 200, contentType: 'text/html', body: '<html>Accept our terms</html>' }));
  await page.goto(address(day, 'note', planting?.id));
  await page.getByLabel('What is to be known here').fill('Written behind a sign-in page of a network');
  await page.getByRole('button', { name: 'Keep', exact: true }).click();
  await page.goto(address(day, 'kept'));
  await page.getByRole('button', { name: 'Send now' }).click();
  await expect(page.getByText('No answer from the server')).toBeVisible();
  await expect(page.getByRole('heading', { level: 1, name: '1 entry kept on this phone' })).toBeVisible();
  await page.unroute('**/api/**');
  await page.getByRole('button', { name: 'Send now' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Everything is sent' })).toBeVisible({ timeout: 30_000 });
});

for (const theme of ['light', 'dark']) {
  test(`every field screen reads out cleanly, in ${theme}: contrast 7 to 1, targets of 56 pixels, nothing sideways`, async ({ page }) => {
    // Seventeen screens, each loaded anew and read through.
    test.setTimeout(420_000);
    const day = await takeAlong(page, 'Pell');
    await page.evaluate((chosen) => localStorage.setItem('rowrise-theme', chosen), theme);
    const planting = day.plantings.find((each) => each.hasTrial);
    const row = planting?.rows[0]?.id;
    const screens: [at: string, planting?: string, row?: string][] = [
      ['count', planting?.id, row], ['today'], ...['count', 'row', 'tape', 'depth', 'cover', 'dig', 'crust', 'photos', 'note', 'condition'].map((at): [string, string | undefined, string | undefined] => [at, planting?.id, row]),
      ['transect', planting?.id], ['markers', planting?.id], ['spraying', planting?.id], ['spot'], ['kept'], ['leave'],
    ];
    const found: string[] = [];
    for (const [index, [at, plantingId, rowId]] of screens.entries()) {
      await page.goto(address(day, at, plantingId, rowId));
      await expect(page.getByRole('heading', { level: 1 })).not.toHaveText(/^Opening/);
      // The first is the gate itself; then the field has been entered.
      const { violations } = await new AxeBuilder({ page })
        .options({ runOnly: { type: 'tag', values: ['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'] }, rules: { 'color-contrast-enhanced': { enabled: true } } })
        .analyze();
      for (const { id, nodes } of violations) found.push(`${at}: ${id}: ${nodes.map((node) => node.target.join(' ')).join(', ').slice(0, 200)}`);
      found.push(...(await page.evaluate((screen) => {
        const small = [...document.querySelectorAll<HTMLElement>('button, a[href], select, summary, input:not([type=file]), textarea')].filter((each) => {
          const box = each.getBoundingClientRect();
          return box.width > 0 && (box.height < 55.5 || box.width < 44);
        });
        const wide = document.documentElement.scrollWidth > document.documentElement.clientWidth ? [`${screen}: scrolls sideways`] : [];
        return [...wide, ...small.map((each) => `${screen}: ${each.tagName} "${(each.textContent ?? '').slice(0, 30)}" is ${Math.round(each.getBoundingClientRect().width)} × ${Math.round(each.getBoundingClientRect().height)}`)];
      }, at)));
      if (index === 0) await enter(page);
    }
    expect([...new Set(found)]).toEqual([]);
  });
}

test('the field page is no more than 1.6 times a bare page, and carries none of the heavy libraries', () => {
  const built = join(process.cwd(), '.next');
  const scriptsOf = (page: string) => [...new Set([...readFileSync(join(built, 'server/app', `${page}.html`), 'utf8').matchAll(/src="\/_next\/(static\/[^"]+\.js)"/g)].map((match) => match[1] ?? ''))];
  const bytes = (files: readonly string[]) => files.reduce((sum, file) => sum + gzipSync(readFileSync(join(built, file))).length, 0);
  const [field, bare] = [scriptsOf('round'), scriptsOf('_not-found')];
  const ratio = bytes(field) / bytes(bare);
  console.log(`field page ${bytes(field)} bytes of script, bare page ${bytes(bare)}, ratio ${ratio.toFixed(2)}`);
  expect(ratio).toBeLessThanOrEqual(1.6);
  const text = field.map((file) => readFileSync(join(built, file), 'utf8')).join('\n');
  for (const mark of ['recharts', 'react-hook-form', 'ZodError', '$ZodType', 'QueryClient', 'temporal-polyfill', 'studentized']) expect(text.includes(mark), mark).toBe(false);
});
