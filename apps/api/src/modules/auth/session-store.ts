// The only file that knows Lucia; everything else speaks of sessions.
import { createHash } from 'node:crypto';
import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import { people, sessions } from '@ligament/domain/schema/people';
import { and, desc, eq, lte, ne, or } from 'drizzle-orm';
import { Lucia, TimeSpan, type Adapter } from 'lucia';
import type { Clock } from '../../clock';
import type { Database } from '../../db/database';

type SessionRow = typeof sessions.$inferSelect;
type PersonRow = typeof people.$inferSelect;
/** Lucia keeps a member `expiresAt` of its own; ours travels under another name. */
type SessionFacts = Omit<SessionRow, 'id' | 'userId' | 'expiresAt'> & { readonly idleUntil: Date };
type PersonFacts = Omit<PersonRow, 'id'>;

declare module 'lucia' {
  interface Register {
    Lucia: Lucia<SessionFacts, PersonFacts>;
    DatabaseSessionAttributes: SessionFacts;
    DatabaseUserAttributes: PersonFacts;
  }
}

const HOUR = 3_600_000;
export const IDLE_MILLISECONDS = 8 * HOUR;
export const ABSOLUTE_MILLISECONDS = 12 * HOUR;
const REFRESH_MILLISECONDS = 60_000;

export const SESSION_COOKIE = '__Host-ligament';

/** Where a session is opened from. */
export interface SessionSource {
  readonly address: string;
  readonly userAgent: string;
}

export interface LiveSession {
  readonly session: SessionRow;
  readonly person: PersonRow;
}

/** Identifier a session is kept under; the cookie holds what it is made from. */
export const storedId = (cookieValue: string): string =>
  createHash('sha256').update(cookieValue).digest('hex');

/** Sessions on a database or within a transaction. The injected clock alone decides what has ended. */
export function sessionStore(db: Database, clock: Clock) {
  const lucia = luciaOn(db);
  return {
    /** Opens a session; the answer holds the cookie that carries it. */
    async open(
      personId: string,
      source: SessionSource,
    ): Promise<{ id: string; setCookie: string }> {
      const now = clock.now();
      await db.delete(sessions).where(and(eq(sessions.userId, personId), endedBy(now)));
      const { id } = await lucia.createSession(personId, {
        idleUntil: new Date(now.getTime() + IDLE_MILLISECONDS),
        absoluteExpiresAt: new Date(now.getTime() + ABSOLUTE_MILLISECONDS),
        createdAt: now,
        lastSeenAt: now,
        provedAt: now,
        userAgent: oneLine(source.userAgent, 200),
        address: oneLine(source.address, 64),
      });
      return { id: storedId(id), setCookie: lucia.createSessionCookie(id).serialize() };
    },

    /** The live session a request carries, or null; being seen keeps it from idling out. */
    async read(cookieHeader: string): Promise<LiveSession | null> {
      const value = lucia.readSessionCookie(cookieHeader);
      if (!value || value.length > 100) return null;
      const { session, user } = await lucia.validateSession(value);
      if (!session) return null;
      const now = clock.now().getTime();
      const { idleUntil: expiresAt, fresh: _fresh, ...facts } = session;
      const live = { session: { ...facts, id: storedId(value), expiresAt }, person: user };
      if (now >= expiresAt.getTime() || now >= session.absoluteExpiresAt.getTime()) {
        await this.end(live.session.id);
        return null;
      }
      await stayAlive(db, live.session, now);
      return live;
    },

    async end(id: string): Promise<void> {
      await db.delete(sessions).where(eq(sessions.id, id));
    },

    /** Ends a person's sessions, all or all but one; answers how many. */
    async endAllOf(personId: string, exceptId = ''): Promise<number> {
      const ended = await db
        .delete(sessions)
        .where(and(eq(sessions.userId, personId), ne(sessions.id, exceptId)))
        .returning({ id: sessions.id });
      return ended.length;
    },

    async prove(id: string): Promise<void> {
      await db.update(sessions).set({ provedAt: clock.now() }).where(eq(sessions.id, id));
    },

    /** A person's live sessions, the one used last first. */
    async listOf(personId: string): Promise<SessionRow[]> {
      const now = clock.now();
      const rows = await db
        .select()
        .from(sessions)
        .where(eq(sessions.userId, personId))
        .orderBy(desc(sessions.lastSeenAt));
      return rows.filter((row) => row.expiresAt > now && row.absoluteExpiresAt > now);
    },

    /** Removes sessions that have ended; nothing depends on it but the size of the table. */
    async deleteEnded(): Promise<void> {
      await db.delete(sessions).where(endedBy(clock.now()));
    },

    /** Makes the browser forget the session. */
    blankCookie: (): string => lucia.createBlankSessionCookie().serialize(),
  };
}

const endedBy = (now: Date) =>
  or(lte(sessions.expiresAt, now), lte(sessions.absoluteExpiresAt, now));

/** Slides the idle limit, never past the absolute one; written at most once a minute. */
async function stayAlive(db: Database, session: SessionRow, now: number): Promise<void> {
  if (now - session.lastSeenAt.getTime() < REFRESH_MILLISECONDS) return;
  const idle = Math.min(now + IDLE_MILLISECONDS, session.absoluteExpiresAt.getTime());
  await db
    .update(sessions)
    .set({ lastSeenAt: new Date(now), expiresAt: new Date(idle) })
    .where(eq(sessions.id, session.id));
}

function luciaOn(db: Database): Lucia<SessionFacts, PersonFacts> {
  return new Lucia(hashedIds(new DrizzlePostgreSQLAdapter(db, sessions, people)), {
    sessionExpiresIn: new TimeSpan(ABSOLUTE_MILLISECONDS / HOUR, 'h'),
    sessionCookie: {
      name: SESSION_COOKIE,
      attributes: { secure: true, sameSite: 'strict', path: '/' },
    },
    getSessionAttributes: (attributes) => attributes,
    getUserAttributes: (attributes) => attributes,
  });
}

/**
 * Keeps the SHA-256 of identifiers instead of the identifiers, so that a leaked table opens no session. Lucia judges
 * expiry by the system's clock; it is told "fresh" always, because the store judges by the injected clock.
 */
function hashedIds(adapter: Adapter): Adapter {
  return {
    async getSessionAndUser(id) {
      const [session, user] = await adapter.getSessionAndUser(storedId(id));
      if (!session || !user) return [null, null];
      const attributes = { ...session.attributes, idleUntil: session.expiresAt };
      return [{ ...session, id, attributes, expiresAt: new Date(Date.now() + 100 * HOUR) }, user];
    },
    setSession: (session) =>
      adapter.setSession({
        ...session,
        id: storedId(session.id),
        expiresAt: session.attributes.idleUntil,
      }),
    deleteSession: (id) => adapter.deleteSession(storedId(id)),
    updateSessionExpiration: (id, at) => adapter.updateSessionExpiration(storedId(id), at),
    getUserSessions: (userId) => adapter.getUserSessions(userId),
    deleteUserSessions: (userId) => adapter.deleteUserSessions(userId),
    deleteExpiredSessions: () => adapter.deleteExpiredSessions(),
  };
}

/** What a browser says about itself, fit for display. */
function oneLine(text: string, max: number): string {
  // eslint-disable-next-line no-control-regex -- control characters are what is taken out
  return text.replaceAll(/[\u0000-\u001f\u007f]/g, ' ').slice(0, max);
}
