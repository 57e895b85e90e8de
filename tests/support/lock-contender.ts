// A process of its own that takes the lock of a data folder at a given moment and says on its output how that went.
import { setTimeout as wait } from 'node:timers/promises';
import { lockDataFolder } from '../../apps/api/src/db/data-folder-lock';
import { DataFolderInUse } from '../../apps/api/src/db/database-failures';

const [folder = '', startAt = '0'] = process.argv.slice(2);
await wait(Math.max(0, Number(startAt) - Date.now() - 20));
while (Date.now() < Number(startAt));
try {
  lockDataFolder(folder);
  process.stdout.write('taken\n');
} catch (error) {
  process.stdout.write(error instanceof DataFolderInUse ? 'in use\n' : `${String(error)}\n`);
}
// keeps the lock alive until the test ends this process
await wait(30_000);
