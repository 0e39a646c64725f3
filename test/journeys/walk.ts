import { mkdirSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { noteCookie } from '../api/faults-of-log';
import { startApi, type Api } from '../api/start-api';
import { password } from '../api/test-workshop';
import { openBrowser, unhurried } from './open-browser';
import { desk, type Screen } from './screens';

const root = join(__dirname, '../..');
/** Pictures are kept for somebody who wants to look at them and says so (`PICTURES=1`): of a whole run nobody would. */
const pictures = process.env['PICTURES'] ? join(__dirname, 'screenshots') : undefined;

/** Somebody at a browser of their own. `complaints` gathers what the browser objected to. */
export interface Person {
  readonly page: Page;
  readonly context: BrowserContext;
  readonly complaints: string[];
  /** Keeps a picture of what they see, where pictures are wanted. */
  see(name: string): Promise<void>;
}

/** The application on loopback with its built pages, and browsers to walk through it. */
export class Walk {
  private constructor(
    readonly api: Api,
    private readonly server: Server,
    private readonly browser: Browser,
  ) {}

  get address(): string {
    return `http://127.0.0.1:${(this.server.address() as AddressInfo).port}`;
  }

  static async begin(): Promise<Walk> {
    const server = createServer();
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    // It knows its port, for what leads back to it from elsewhere.
    const { port } = server.address() as AddressInfo;
    const api = await startApi({ WEB_DIR: join(root, 'dist/web'), PORT: String(port) });
    server.on('request', api.app.web.express);
    const browser = await openBrowser(unhurried);
    if (pictures) mkdirSync(pictures, { recursive: true });
    return new Walk(api, server, browser);
  }

  async end(): Promise<void> {
    for (const context of this.browser.contexts()) {
      for (const { value } of await context.cookies()) noteCookie(value);
    }
    await this.browser.close();
    await new Promise<void>((resolve) => {
      this.server.close(() => resolve());
      this.server.closeAllConnections();
    });
    await this.api.stop();
  }

  /** Somebody who was never here. */
  async stranger({ width, height, dark = false, touch = false }: Screen = desk): Promise<Person> {
    const context = await this.browser.newContext({
      viewport: { width, height },
      colorScheme: dark ? 'dark' : 'light',
      reducedMotion: 'reduce',
      hasTouch: touch,
      isMobile: touch,
    });
    const page = await context.newPage();
    page.setDefaultTimeout(30_000);
    const complaints: string[] = [];
    page.on('console', (message) => {
      if (message.type() === 'error') complaints.push(`${message.text()} ${message.location().url}`.trim());
    });
    page.on('pageerror', (error) => complaints.push(error.message));
    const see = async (name: string) => {
      if (pictures) await page.screenshot({ path: join(pictures, `${name}.png`) });
    };
    return { page, context, complaints, see };
  }

  /** Somebody of our workshop, signed in by hand. */
  async as(role: 'owner' | 'estimator' | 'office' | 'bench', screen: Screen = desk): Promise<Person> {
    const person = await this.stranger(screen);
    await person.page.goto(`${this.address}/sign-in`);
    await person.page.getByLabel('E-mail address').fill(this.api.ours.people[role].email);
    await person.page.getByRole('textbox', { name: 'Password' }).fill(password);
    await person.page.getByRole('button', { name: 'Sign in' }).click();
    await person.page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
    return person;
  }
}
