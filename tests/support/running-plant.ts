import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';
import { chromium, type Browser, type Page } from 'playwright-core';
import { createApp } from '../../apps/api/src/app';
import { settableClock } from '../../apps/api/src/clock';
import { readConfig } from '../../apps/api/src/config';
import { openMemoryDatabase } from '../../apps/api/src/db/open-memory-database';
import type { Deps } from '../../apps/api/src/deps';
import { drain, listen } from '../../apps/api/src/listen';
import { startMail } from '../../apps/api/src/mail/start-mail';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../seeds/plant/people';
import { seedDemo } from '../../seeds/seed-demo';

/** Day of the scenario, so that the example files agree with the plant. */
export const JOURNEY_DAY = new Date('2026-12-01T09:00:00Z');

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

async function freePort(): Promise<number> {
  const probe = createServer();
  await new Promise<void>((resolve) => probe.listen(0, 'localhost', resolve));
  const { port } = probe.address() as AddressInfo;
  await new Promise((resolve) => probe.close(resolve));
  return port;
}

/** The whole product with the demonstration plant, a clock that is set by hand, and a browser in front of it. */
export async function runningPlant({ demo }: { readonly demo: boolean }) {
  const memory = await openMemoryDatabase();
  const clock = settableClock(JOURNEY_DAY);
  const port = await freePort();
  const config = readConfig({
    PORT: String(port),
    LIGAMENT_LOG: process.env['LIGAMENT_TEST_LOG'] ?? 'silent',
  });
  const deps: Deps = {
    db: memory.db,
    clock,
    config,
    log: pino({ level: config.logLevel }),
    databaseHealthy: () => true,
  };
  if (demo) await seedDemo(deps);
  const mail = await startMail(deps);
  const { app } = createApp({ ...deps, mailer: mail.mailer }, 'dist/client');
  const server: Server = await listen(app, 'localhost', port);
  const browser: Browser = await chromium.launch({
    executablePath: process.env['LIGAMENT_CHROMIUM'] ?? '/usr/bin/chromium',
    args: FLAGS,
  });
  const base = `http://localhost:${port}`;
  const faults: string[] = [];
  return {
    deps,
    clock,
    mailer: mail.mailer,
    base,
    /** What the browser complained of: broken scripts, refused content. */
    faults,
    newPage: async (): Promise<Page> => {
      const page = await browser.newPage({ viewport: { width: 1366, height: 900 } });
      page.setDefaultTimeout(30_000);
      page.on('pageerror', (error) => faults.push(error.message));
      page.on('console', (message) => {
        if (/Content Security Policy/i.test(message.text())) faults.push(message.text());
      });
      return page;
    },
    close: async () => {
      await browser.close();
      await drain(server, 1);
      await mail.close();
      await memory.close();
    },
  };
}

export type RunningPlant = Awaited<ReturnType<typeof runningPlant>>;

/** Signs a person of the demonstration plant in from the sign-in page, in a browser of their own. */
export async function signIn(plant: RunningPlant, key: string): Promise<Page> {
  const person = DEMO_PEOPLE.find((each) => each.key === key);
  if (!person) throw new Error(`nobody is called ${key}`);
  const page = await plant.newPage();
  await page.goto(`${plant.base}/sign-in`);
  await page.getByLabel('E-mail').fill(person.email);
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL('**/today');
  return page;
}

/** Signs out by the person's menu, and closes the page. */
export async function leave(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^Signed in as/ }).click();
  await page.getByRole('menuitem', { name: 'Sign out' }).click();
  await page.waitForURL('**/sign-in');
  await page.close();
}
