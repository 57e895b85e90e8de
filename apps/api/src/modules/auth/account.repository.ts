import { people, sessions } from '@ligament/domain/schema/people';
import { sites } from '@ligament/domain/schema/sites';
import { eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

export type Person = typeof people.$inferSelect;

/** SQL of signing in: people by their address, their failures and passwords, and what a session shows. */
export const accountRepository = (db: Database) => ({
  async byEmail(email: string): Promise<Person | undefined> {
    const [person] = await db.select().from(people).where(eq(people.email, email));
    return person;
  },

  async byId(id: string): Promise<Person | undefined> {
    const [person] = await db.select().from(people).where(eq(people.id, id));
    return person;
  },

  /** The person, held against other writers until the transaction ends. */
  async lockById(id: string): Promise<Person | undefined> {
    const [person] = await db.select().from(people).where(eq(people.id, id)).for('update');
    return person;
  },

  async setFailures(id: string, failedSignIns: number, lockedUntil: Date | null): Promise<void> {
    await db.update(people).set({ failedSignIns, lockedUntil }).where(eq(people.id, id));
  },

  /** A better hash of the same password; nothing that anybody sees changes. */
  async rehash(id: string, passwordHash: string): Promise<void> {
    await db.update(people).set({ passwordHash }).where(eq(people.id, id));
  },

  /** A new password; it lifts a lock, because whoever sets it has proved who they are. */
  async setPassword(id: string, passwordHash: string, now: Date, name?: string): Promise<void> {
    await db
      .update(people)
      .set({
        passwordHash,
        failedSignIns: 0,
        lockedUntil: null,
        updatedAt: now,
        version: sql`${people.version} + 1`,
        ...(name === undefined ? {} : { name }),
      })
      .where(eq(people.id, id));
  },

  async anybody(): Promise<boolean> {
    const found = await db.select({ id: people.id }).from(people).limit(1);
    return found.length > 0;
  },

  async siteOf(siteId: string) {
    const [site] = await db.select().from(sites).where(eq(sites.id, siteId));
    return site;
  },

  /** Session, person and site together, as the signed-in page shows them. */
  async sessionFacts(sessionId: string) {
    const [row] = await db
      .select({ session: sessions, person: people, site: sites })
      .from(sessions)
      .innerJoin(people, eq(people.id, sessions.userId))
      .innerJoin(sites, eq(sites.id, people.siteId))
      .where(eq(sessions.id, sessionId));
    return row;
  },
});
