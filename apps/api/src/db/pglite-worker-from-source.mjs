// Started as the worker when the server runs from source: registers tsx, then loads the real worker.
import { register } from 'tsx/esm/api';

register();
await import('./pglite-worker.ts');
