import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { sites } from '@ligament/domain/schema/sites';
import { pino } from 'pino';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../../seeds/plant/people';
import { seedDemo } from '../../../seeds/seed-demo';
import { createApp } from './app';
import { systemClock } from './clock';
import { readConfig, type Config } from './config';
import { openDatabase } from './db/open-database';
import type { Deps } from './deps';
import { startJobs } from './jobs/scheduler';
import { drain, listen, portOf } from './listen';
import { startMail } from './mail/start-mail';
import { issueSetUpToken } from './modules/auth/issue-set-up-token';

const GRACE_SECONDS = 10;

/** Repository root, seen from the source as well as from the bundle in dist/api. */
const ROOT = resolve(
  fileURLToPath(import.meta.url),
  import.meta.url.endsWith('.ts') ? '../../../..' : '../../..',
);

/** Starts the product: settings, database, demonstration plant or first administrator, mail, jobs, HTTP. */
export async function start(env: Readonly<Record<string, string | undefined>>): Promise<void> {
  const config = readConfig(env);
  const log = pino({
    level: config.logLevel,
    redact: ['req.headers.cookie', 'req.headers.authorization'],
  });
  const database = await openDatabase({
    dataDir: resolve(ROOT, config.dataDir),
    databaseUrl: config.databaseUrl,
    log,
  });
  const closers: (() => Promise<void>)[] = [() => database.close()];
  try {
    const deps: Deps = {
      db: database.db,
      clock: systemClock,
      config,
      log,
      databaseHealthy: database.healthy,
    };
    const prepared = await prepare(deps);
    const mail = await startMail(deps);
    closers.unshift(() => mail.close());
    const jobs = startJobs(deps, mail.mailer);
    closers.unshift(() => jobs.close());
    const { app } = createApp({ ...deps, mailer: mail.mailer }, resolve(ROOT, 'dist/client'));
    const server = await listen(app, config.host, config.port);
    closers.unshift(() => drain(server, GRACE_SECONDS));
    announce(config, portOf(server), prepared);
    closeOnSignal(closers);
  } catch (error) {
    for (const close of closers) await close();
    throw error;
  }
}

interface Prepared {
  /** Whether the database holds the demonstration plant. */
  readonly demo: boolean;
  /** One-time token with which the first administrator is created; null when that is done. */
  readonly setUpToken: string | null;
}

/** Fills an empty database: with the invented plant, or with the means to create the first administrator. */
async function prepare(deps: Deps): Promise<Prepared> {
  const [site] = await deps.db.select({ demo: sites.demo }).from(sites).limit(1);
  if (site) return { demo: site.demo, setUpToken: null };
  if (!deps.config.demo) return { demo: false, setUpToken: await issueSetUpToken(deps) };
  console.log('Filling the empty database with the demonstration plant …');
  await seedDemo(deps);
  return { demo: true, setUpToken: null };
}

function announce(config: Config, port: number, { demo, setUpToken }: Prepared): void {
  const address = config.publicUrl.replace(/:0$/, `:${port}`);
  console.log(`\nLigament is ready at ${address}`);
  if (setUpToken !== null) {
    console.log(
      `Create the first administrator (once, within 24 hours): ${address}/setup#${setUpToken}`,
    );
  }
  if (demo) {
    console.log(`Demonstration sign-ins, all with the password "${DEMO_PASSWORD}":`);
    for (const person of DEMO_PEOPLE) console.log(`  ${person.role.padEnd(14)} ${person.email}`);
  }
  console.log('Stop with Ctrl+C.');
}

/** The first signal closes cleanly, requests first and the database last; a second one ends at once. */
function closeOnSignal(closers: readonly (() => Promise<void>)[]): void {
  let closing = false;
  const close = async () => {
    if (closing) process.exit(1);
    closing = true;
    for (const each of closers) await each();
    process.exit(0);
  };
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void close());
}
