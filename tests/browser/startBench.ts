import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { ServerType } from '@hono/node-server';
import type { Browser, BrowserContext, BrowserContextOptions } from 'playwright-core';
import { serve } from '../../api/serve.ts';
import { Bench } from './bench.ts';
import { launch } from './chromium.ts';

const web = fileURLToPath(new URL('../../dist/web', import.meta.url));

/** A browser's own store with the bench in it, apart from all others. */
export interface Visit {
  readonly context: BrowserContext;
  /** What no visit may bring: console errors and warnings, uncaught errors, broken content policy, requests to other places. */
  readonly faults: string[];
  /** Opens the bench in a tab, with the end of a link if one is given, and waits until both stand. */
  readonly tab: (link?: string) => Promise<Bench>;
}

export interface RunningBench {
  /** Where the bench is served, with a slash behind it. */
  readonly site: string;
  readonly visit: (options?: BrowserContextOptions) => Promise<Visit>;
  readonly stopServing: () => Promise<void>;
  readonly stop: () => Promise<void>;
}

/** Notes what no visit may bring, and keeps the page from every other place. */
const watch = async (context: BrowserContext, site: string): Promise<string[]> => {
  const faults: string[] = [];
  const own = new URL(site).origin;
  await context.route(
    (url) => url.origin !== own,
    (route) => {
      faults.push(`asked for ${route.request().url()}`);
      return route.abort();
    },
  );
  context.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) faults.push(`${message.type()}: ${message.text()}`);
  });
  context.on('weberror', (uncaught) => faults.push(`uncaught: ${uncaught.error().message}`));
  await context.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI }) => {
      console.error(`policy: ${violatedDirective} ${blockedURI}`);
    });
  });
  return faults;
};

const newVisit = async (browser: Browser, site: string, options: BrowserContextOptions): Promise<Visit> => {
  const context = await browser.newContext({ viewport: { width: 1440, height: 1000 }, ...options });
  const faults = await watch(context, site);
  const tab = async (link = '') => {
    const page = await context.newPage();
    page.setDefaultTimeout(20_000);
    await page.goto(link ? `${site}#${link}` : site, { waitUntil: 'domcontentloaded' });
    const bench = new Bench(page);
    await bench.drawing.waitFor();
    if (link) await page.getByText(/^(?:Opened|Not opened:) the link/).waitFor();
    return bench;
  };
  return { context, faults, tab };
};

const closed = async (server: ServerType): Promise<void> => {
  if (!server.listening) return;
  const end = new Promise<void>((resolve) => server.once('close', resolve));
  server.close();
  if ('closeAllConnections' in server) server.closeAllConnections();
  await end;
};

/** The built bench behind the real server on a free port of this machine, and a browser to see it with. */
export const startBench = async (): Promise<RunningBench> => {
  if (!existsSync(`${web}/index.html`)) throw new Error('The bench is not built: npm run build.');
  const { server, url } = await serve({ host: '127.0.0.1', port: 0, web });
  const stopServing = () => closed(server);
  try {
    const browser = await launch();
    return {
      site: `${url}/`,
      visit: (options = {}) => newVisit(browser, `${url}/`, options),
      stopServing,
      stop: () => browser.close().finally(stopServing),
    };
  } catch (error) {
    await stopServing();
    throw error;
  }
};
