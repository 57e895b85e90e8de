import type { listPeople } from '@ligament/domain/contract/people';
import { people, sessions } from '@ligament/domain/schema/people';
import { sites } from '@ligament/domain/schema/sites';
import { and, count, eq, gt, ilike, max, ne, or, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { containing, decodeCursor } from '../../http/cursor';

export type PersonRow = typeof people.$inferSelect;
export type NewPerson = typeof people.$inferInsert;
type ListQuery = z.output<typeof listPeople.query>;

/** A person with what their sessions tell. */
export interface PersonWithSessions {
  readonly person: PersonRow;
  readonly sessions: number;
  readonly lastSeenAt: Date | null;
}

/** Text every sort compares by; what is missing comes last. */
const SORT_TEXT = {
  name: sql<string>`lower(${people.name})`,
  email: sql<string>`${people.email}`,
  role: sql<string>`${people.role}`,
  organisation: sql<string>`lower(${people.organisation})`,
  certificateValidUntil: sql<string>`coalesce(${people.certificateValidUntil}::text, '9999-12-31')`,
} satisfies Readonly<Record<string, SQL<string>>>;

const isDownwards = (sort: ListQuery['sort']): boolean => sort.startsWith('-');

const sortText = (sort: ListQuery['sort']): SQL<string> =>
  SORT_TEXT[sort.replace('-', '') as keyof typeof SORT_TEXT];

export const peopleRepository = (db: Database) => ({
  /** One more than the limit, to know whether a page follows. */
  async list(siteId: string, query: ListQuery, now: Date) {
    const text = sortText(query.sort);
    const live = liveSessions(db, now);
    const direction = isDownwards(query.sort) ? sql`desc` : sql`asc`;
    return db
      .select({
        person: people,
        sessions: live.sessions,
        lastSeenAt: live.lastSeenAt,
        sortText: text,
      })
      .from(people)
      .leftJoin(live, eq(live.userId, people.id))
      .where(and(eq(people.siteId, siteId), matches(query), after(query, text)))
      .orderBy(sql`${text} ${direction}`, sql`${people.id}::text ${direction}`)
      .limit(query.limit + 1);
  },

  async byId(siteId: string, id: string, now: Date): Promise<PersonWithSessions | undefined> {
    const live = liveSessions(db, now);
    const [row] = await db
      .select({ person: people, sessions: live.sessions, lastSeenAt: live.lastSeenAt })
      .from(people)
      .leftJoin(live, eq(live.userId, people.id))
      .where(and(eq(people.siteId, siteId), eq(people.id, id)));
    return row && { ...row, sessions: row.sessions ?? 0 };
  },

  async emailTaken(email: string): Promise<boolean> {
    const found = await db.select({ id: people.id }).from(people).where(eq(people.email, email));
    return found.length > 0;
  },

  async siteOf(siteId: string) {
    const [site] = await db.select().from(sites).where(eq(sites.id, siteId));
    return site;
  },

  /** Holds the site, so that two changes of who administers it come one after the other. */
  async lockSite(siteId: string): Promise<void> {
    await db.select({ id: sites.id }).from(sites).where(eq(sites.id, siteId)).for('update');
  },

  /** Whether somebody else could still administer the site. */
  async hasOtherAdministrator(siteId: string, exceptId: string, today: string): Promise<boolean> {
    const [row] = await db
      .select({ number: count() })
      .from(people)
      .where(
        and(
          eq(people.siteId, siteId),
          eq(people.role, 'administrator'),
          eq(people.active, true),
          ne(people.id, exceptId),
          sql`${people.passwordHash} is not null`,
          sql`coalesce(${people.accessUntil}, '9999-12-31') >= ${today}`,
        ),
      );
    return (row?.number ?? 0) > 0;
  },

  async add(person: NewPerson): Promise<PersonRow | undefined> {
    const [added] = await db.insert(people).values(person).returning();
    return added;
  },

  /** Changes the person only in the version that was seen. */
  async change(
    siteId: string,
    id: string,
    seen: number,
    change: Partial<NewPerson>,
  ): Promise<PersonRow | undefined> {
    const [changed] = await db
      .update(people)
      .set({ ...change, version: sql`${people.version} + 1` })
      .where(and(eq(people.siteId, siteId), eq(people.id, id), eq(people.version, seen)))
      .returning();
    return changed;
  },
});

function liveSessions(db: Database, now: Date) {
  return db
    .select({
      userId: sessions.userId,
      sessions: count().as('live_sessions'),
      lastSeenAt: max(sessions.lastSeenAt).as('last_seen'),
    })
    .from(sessions)
    .where(and(gt(sessions.expiresAt, now), gt(sessions.absoluteExpiresAt, now)))
    .groupBy(sessions.userId)
    .as('live');
}

function matches({ search, role }: ListQuery): SQL | undefined {
  const words = search ? containing(search) : undefined;
  return and(
    role ? eq(people.role, role) : undefined,
    words
      ? or(
          ilike(people.name, words),
          ilike(people.email, words),
          ilike(people.organisation, words),
          ilike(people.competence, words),
          ilike(people.certificateNo, words),
        )
      : undefined,
  );
}

function after({ cursor, sort }: ListQuery, text: SQL<string>): SQL | undefined {
  if (cursor === undefined) return undefined;
  const [value, id] = decodeCursor(cursor, ['string', 'string']);
  return isDownwards(sort)
    ? sql`(${text}, ${people.id}::text) < (${value}, ${id})`
    : sql`(${text}, ${people.id}::text) > (${value}, ${id})`;
}
