import { sites } from '@ligament/domain/schema/sites';
import { sql } from 'drizzle-orm';
import { openMemoryDatabase } from './open-memory-database';

describe('openMemoryDatabase', () => {
  it('gives each test a migrated, empty database of its own under the application’s role', async () => {
    const [one, other] = await Promise.all([openMemoryDatabase(), openMemoryDatabase()]);
    await one.db.insert(sites).values({ code: 'ONE', name: 'One', timeZone: 'UTC' });
    expect(await other.db.select().from(sites)).toEqual([]);
    expect(await one.db.execute(sql`select current_user as name`)).toMatchObject({
      rows: [{ name: 'ligament_app' }],
    });
    await Promise.all([one.close(), other.close()]);
  }, 60_000);
});
