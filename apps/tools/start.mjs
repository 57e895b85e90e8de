// npm start: builds when the sources have changed since the last build, then runs the product in this process.
import { fileURLToPath } from 'node:url';
import { isBuilt } from './source-stamp.mjs';

const root = fileURLToPath(new URL('../../', import.meta.url));
process.chdir(root);

if (!isBuilt(root)) {
  console.log('Building client and API (about a minute, once after each change) …');
  const { buildAll } = await import('./build.mjs');
  try {
    await buildAll();
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  }
}
await import(`${root}dist/api/main.js`);
