import sharp from 'sharp';
import type { Locator, Page } from '@playwright/test';
import type { Chance } from '../chaos/chance';
import type { FieldScene } from './scene';

/** Everything the script entered, as the database must hold it. */
export type Entered = {
  counts: { label: string; on: string; countedAs: string; plants: number; doubtful: number; marker: string | null }[];
  tapeSheets: { label: string; on: string; places: string[] }[];
  depths: { label: string; depths: string[] }[];
  cover: { label: string; marksRead: number; marksCovered: number }[];
  transects: { marksRead: number; marksCovered: number }[];
  digs: { label: string; plant: string; depth: string }[];
  photos: number;
};
export const nothingEntered = (): Entered => ({ counts: [], tapeSheets: [], depths: [], cover: [], transects: [], digs: [], photos: 0 });

/** The kinds of press after which a phone may go off: typed and not kept yet, or kept. */
export const pressKinds = ['typed', 'count', 'none-new', 'place-typed', 'tape-sheet', 'tape-sheet-again', 'depth', 'cover', 'transect', 'dig', 'neighbor', 'photo'] as const;
export type PressKind = (typeof pressKinds)[number];

const button = (page: Page, name: string | RegExp): Locator => page.getByRole('button', { name, exact: typeof name === 'string' });

/** One scripted scout at the phone's screens. Every press is one that a thumb would make. */
export class Walk {
  constructor(
    readonly scene: FieldScene,
    readonly entered: Entered,
    readonly chance: Chance,
    private readonly pageOf: () => Page,
    /** Called after each thing that the screen has said is kept or typed; may lose power and open the phone again. */
    private readonly after: (press: PressKind) => Promise<void>,
  ) {}

  private get page() {
    return this.pageOf();
  }

  address(at: string, label?: string): string {
    const row = label ? `&row=${this.scene.rows.find((each) => each.label === label)?.id}` : '';
    return `/round?org=${this.scene.organisationId}&at=${at}&planting=${this.scene.plantingId}${row}`;
  }

  /** Goes somewhere without loading the page anew, as Back and the buttons of the page do. */
  async go(address: string): Promise<void> {
    // Not before the page has opened its store: until then the framework still writes its own address over ours.
    await this.page.getByRole('heading', { level: 1 }).filter({ hasNotText: 'Opening' }).first().waitFor();
    await this.page.evaluate((to) => {
      window.history.pushState(null, '', to);
      window.dispatchEvent(new Event('rowrise-round-moved'));
      // Two frames on, the screen that was asked for stands there.
      return new Promise((drawn) => requestAnimationFrame(() => requestAnimationFrame(drawn)));
    }, address);
    await this.passGate();
  }

  async passGate(): Promise<void> {
    const heading = this.page.getByRole('heading', { level: 1 });
    await heading.waitFor();
    if (/^Before you enter/.test((await heading.textContent()) ?? '')) {
      await button(this.page, 'Enter the field').click();
      await this.page.getByRole('heading', { level: 1, name: /^Before you enter/ }).waitFor({ state: 'detached' });
    }
  }

  /** Counts the row on the screen with the keys, and waits until the screen has gone on, which it does only once it is kept. */
  async count(label: string, on: string, marker: string | null, plants: number | 'none-new', doubtful: number): Promise<void> {
    await this.page.getByRole('heading', { level: 1, name: label, exact: true }).waitFor();
    // A row whose counting may end already opens on what else is due there; this scout counts it all the same.
    const count = button(this.page, 'Count');
    await count.or(button(this.page, 'Looked, none new')).waitFor();
    if (await count.isVisible()) {
      await count.click();
      await button(this.page, 'Looked, none new').waitFor();
    }
    const before = this.page.url();
    if (plants === 'none-new') await button(this.page, 'Looked, none new').click();
    else {
      for (const digit of String(plants)) await button(this.page, digit).click();
      await this.page.locator('output').filter({ hasText: new RegExp(`^${plants}$`) }).waitFor();
      await this.after('typed');
      // What was typed and not kept stands there again.
      await this.page.locator('output').filter({ hasText: new RegExp(`^${plants}$`) }).waitFor();
      if (doubtful > 0) {
        await button(this.page, 'Type doubtful').click();
        for (const digit of String(doubtful)) await button(this.page, digit).click();
      }
      await button(this.page, /^Keep,/).click();
    }
    await this.page.waitForFunction((url) => window.location.href !== url, before);
    this.entered.counts.push({ label, on, countedAs: plants === 'none-new' ? 'new' : 'so-far', plants: plants === 'none-new' ? 0 : plants, doubtful, marker });
    await this.after(plants === 'none-new' ? 'none-new' : 'count');
  }

  async tape(label: string, on: string, address: string, places: readonly string[]): Promise<void> {
    await this.go(address);
    const unit = this.page.getByRole('radio', { name: /^Running inches/ });
    if ((await unit.getAttribute('aria-checked')) !== 'true') await unit.click();
    await button(this.page, 'Begin').click();
    await this.page.getByRole('heading', { level: 1, name: `Tape sheet of ${label}` }).waitFor();
    for (const place of places) {
      await this.page.keyboard.type(place.replace('½', ''));
      if (place.endsWith('½')) await this.page.keyboard.press('/');
      await this.page.keyboard.press('Enter');
      if (place === places[4]) {
        await button(this.page, 'Keep the sheet with 5 places').waitFor();
        await this.after('place-typed');
        await button(this.page, 'Keep the sheet with 5 places').waitFor();
      }
    }
    await this.keep('tape-sheet', `Keep the sheet with ${places.length} places`, () => this.entered.tapeSheets.push({ label, on, places: [...places] }));
  }

  /** A newer sheet starts from the last one of the row and is kept as it stands. */
  async tapeAgain(label: string, on: string, address: string, places: readonly string[]): Promise<void> {
    await this.go(address);
    await button(this.page, `Correct today's sheet, ${places.length} places`).click();
    await this.keep('tape-sheet-again', `Keep the sheet with ${places.length} places`, () => this.entered.tapeSheets.push({ label, on, places: [...places] }));
  }

  private async keep(kind: PressKind, name: RegExp | string, note: () => void): Promise<void> {
    const before = this.page.url();
    await button(this.page, name).click();
    const yes = button(this.page, 'Yes, keep it');
    await this.page.waitForFunction((url) => window.location.href !== url || [...document.querySelectorAll('button')].some((each) => each.textContent === 'Yes, keep it'), before);
    if (await yes.isVisible().catch(() => false)) await yes.click();
    await this.page.waitForFunction((url) => window.location.href !== url, before);
    note();
    await this.after(kind);
  }

  async depths(label: string, address: string, depths: readonly string[]): Promise<void> {
    await this.go(address);
    for (const depth of depths) {
      const [whole = '', fraction] = depth.split(' ');
      await button(this.page, whole).click();
      if (fraction) await button(this.page, fraction).click();
      await button(this.page, 'Next plant').click();
    }
    await this.keep('depth', new RegExp(`^Keep ${depths.length} depths$`), () => this.entered.depths.push({ label, depths: [...depths] }));
  }

  async cover(label: string | null, address: string, marks: number, covered: number): Promise<void> {
    await this.go(address);
    for (let mark = 0; mark < marks; mark += 1) await button(this.page, mark < covered ? 'Residue' : 'Bare').click();
    await this.keep(label === null ? 'transect' : 'cover', new RegExp(`^Keep ${marks} marks$`), () => {
      if (label === null) this.entered.transects.push({ marksRead: marks, marksCovered: covered });
      else this.entered.cover.push({ label, marksRead: marks, marksCovered: covered });
    });
  }

  /** A late plant and its neighbor, dug after counting has ended. */
  async digPair(label: string, address: string): Promise<void> {
    await this.go(address);
    for (const [plant, depth, keep] of [['late', '2 1/4', 'Keep, then its neighbor'], ['neighbor', '1 3/4', 'Keep']] as const) {
      await this.page.getByRole('radio', { name: 'in the measured length' }).click();
      await this.page.getByLabel(/^Depth of the seed/).fill(depth);
      await this.page.getByRole('radio', { name: 'moist' }).click();
      await this.page.getByRole('checkbox', { name: /Residue pinned/ }).click();
      if (plant === 'late') {
        await button(this.page, keep).click();
        await this.page.getByText('Now its on-time neighbor').waitFor();
        this.entered.digs.push({ label, plant, depth });
        await this.after('dig');
        // After a loss of power the page comes back where it was, with the pair still open.
        await this.passGate();
      } else await this.keep('neighbor', keep, () => this.entered.digs.push({ label, plant, depth }));
    }
  }

  async photos(address: string, howMany: number): Promise<void> {
    await this.go(address);
    for (let index = 0; index < howMany; index += 1) {
      const picture = await sharp({ create: { width: 1_200, height: 900, channels: 3, background: { r: this.chance.whole(0, 255), g: this.chance.whole(0, 255), b: 90 } } }).jpeg().toBuffer();
      const shown = this.page.locator('main li');
      const before = await shown.count();
      await this.page.locator('input[type=file]').setInputFiles({ name: 'field.jpg', mimeType: 'image/jpeg', buffer: picture });
      await this.page.waitForFunction((count) => document.querySelectorAll('main li').length > count, before);
      this.entered.photos += 1;
      await this.after('photo');
    }
  }
}
