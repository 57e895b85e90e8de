// Builds client and API into dist/. Run through `npm run build`, or by start.mjs when the sources have changed.
import { spawnSync } from 'node:child_process';
import { rmSync } from 'node:fs';
import { build } from 'esbuild';
import { fileURLToPath } from 'node:url';
import { writeStamp } from './source-stamp.mjs';

const root = fileURLToPath(new URL('../../', import.meta.url));

/** Bundles the API: our own code in, packages out, the database worker as an entry of its own. */
export async function buildApi() {
  rmSync(`${root}dist/api`, { recursive: true, force: true });
  await build({
    absWorkingDir: root,
    entryPoints: {
      main: 'apps/api/src/main.ts',
      'pglite-worker': 'apps/api/src/db/pglite-worker.ts',
    },
    outdir: 'dist/api',
    bundle: true,
    splitting: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external',
    sourcemap: true,
    logLevel: 'warning',
    alias: { '@ligament/domain': `${root}libs/domain/src` },
    tsconfigRaw: '{}',
  });
}

/** Builds the Angular client for production. */
export function buildClient() {
  const ng = spawnSync(
    process.execPath,
    ['node_modules/@angular/cli/bin/ng.js', 'build', '--stats-json'],
    {
      cwd: root,
      stdio: ['ignore', 'pipe', 'inherit'],
      encoding: 'utf8',
      env: { ...process.env, NG_CLI_ANALYTICS: 'false' },
    },
  );
  if (ng.status !== 0) {
    process.stderr.write(ng.stdout);
    throw new Error('The client could not be built; the reason stands above.');
  }
}

export async function buildAll() {
  buildClient();
  await buildApi();
  writeStamp(root);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) await buildAll();
