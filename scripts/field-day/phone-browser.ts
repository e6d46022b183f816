import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { chromium, type Browser, type Page } from '@playwright/test';

const viewport = { width: 390, height: 844 };

/**
 * The phone's clock, as far off as the harness wants it; timers go on as they are. As a text, because a compiled function
 * calls helpers that no page has.
 */
const shiftedClock = (offset: number) => `{
  const RealDate = Date;
  window.Date = class extends RealDate {
    constructor(...parts) {
      if (parts.length === 0) super(RealDate.now() + ${offset});
      else super(...parts);
    }
    static now() {
      return RealDate.now() + ${offset};
    }
  };
}`;

/** A real browser with a profile that stays, so that its process can be killed like a battery that dies, and opened again. */
export class PhoneBrowser {
  private child: ChildProcess | undefined;
  private browser: Browser | undefined;
  private readonly profile = mkdtempSync(join(tmpdir(), 'rowrise-phone-'));
  page!: Page;
  /** How far the phone's clock stands from the machine's, in milliseconds. */
  clockOffset = 0;
  losses = 0;

  constructor(readonly address: string) {}

  async open(path: string): Promise<Page> {
    this.child = spawn(
      process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      [
        '--headless=new', '--no-sandbox', '--disable-dev-shm-usage', '--disable-gpu', '--disable-background-networking', '--disable-component-update', '--disable-sync', '--no-first-run',
        '--remote-debugging-port=0', `--user-data-dir=${this.profile}`, `--window-size=${viewport.width},${viewport.height}`, 'about:blank',
      ],
      { stdio: ['ignore', 'ignore', 'pipe'], env: { ...process.env, TZ: 'America/Chicago' } },
    );
    const port = await new Promise<string>((found, failed) => {
      let said = '';
      const timer = setTimeout(() => failed(new Error('The browser did not say where it listens.')), 30_000);
      this.child?.stderr?.on('data', (part: Buffer) => {
        said += part.toString();
        const where = /ws:\/\/127\.0\.0\.1:(\d+)\//.exec(said)?.[1];
        if (!where) return;
        clearTimeout(timer);
        found(where);
      });
    });
    this.browser = await chromium.connectOverCDP(`http://127.0.0.1:${port}`);
    const context = this.browser.contexts()[0];
    if (!context) throw new Error('The browser has no profile open.');
    await context.addInitScript(shiftedClock(this.clockOffset));
    this.page = context.pages()[0] ?? (await context.newPage());
    await this.page.setViewportSize(viewport);
    await this.page.goto(`${this.address}${path}`);
    return this.page;
  }

  /** The battery dies: nothing is closed, saved or said goodbye to. */
  async losePower(): Promise<void> {
    this.losses += 1;
    const ended = new Promise((done) => this.child?.once('exit', done));
    this.child?.kill('SIGKILL');
    await ended;
    await this.browser?.close().catch(() => undefined);
    await pause(200);
  }

  async close(): Promise<void> {
    await this.browser?.close().catch(() => undefined);
    const ended = new Promise((done) => this.child?.once('exit', done));
    if (this.child?.exitCode === null) {
      this.child.kill('SIGTERM');
      await Promise.race([ended, pause(3_000)]);
    }
  }

  /** Takes the profile away at the very end. */
  async forget(): Promise<void> {
    await this.close();
    rmSync(this.profile, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
  }
}
