import { createHash, randomBytes } from 'node:crypto';
import { oneTimeTokens } from '@ligament/domain/schema/people';
import { and, eq, gt, isNull } from 'drizzle-orm';
import type { Database } from '../../db/database';
import { Failure } from '../../http/failure';

type Purpose = (typeof oneTimeTokens.$inferSelect)['purpose'];

const MINUTE = 60_000;
const LIFETIME: Readonly<Record<Purpose, number>> = {
  'set-up': 24 * 60 * MINUTE,
  invitation: 72 * 60 * MINUTE,
  'password reset': 30 * MINUTE,
};

export const tokenHash = (token: string): string =>
  createHash('sha256').update(token).digest('hex');

/** Makes a 256-bit token and keeps its SHA-256; earlier ones of the same purpose and person stop working. */
export async function issueToken(
  db: Database,
  purpose: Purpose,
  personId: string | null,
  now: Date,
): Promise<string> {
  await db
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(
      and(
        eq(oneTimeTokens.purpose, purpose),
        personId === null ? isNull(oneTimeTokens.personId) : eq(oneTimeTokens.personId, personId),
        isNull(oneTimeTokens.usedAt),
      ),
    );
  const token = randomBytes(32).toString('base64url');
  await db.insert(oneTimeTokens).values({
    tokenHash: tokenHash(token),
    purpose,
    personId,
    expiresAt: new Date(now.getTime() + LIFETIME[purpose]),
    createdAt: now,
  });
  return token;
}

const live = (purpose: Purpose, token: string, now: Date) =>
  and(
    eq(oneTimeTokens.tokenHash, tokenHash(token)),
    eq(oneTimeTokens.purpose, purpose),
    isNull(oneTimeTokens.usedAt),
    gt(oneTimeTokens.expiresAt, now),
  );

/** Whom a token that still works is for. */
export async function readToken(db: Database, purpose: Purpose, token: string, now: Date) {
  const [row] = await db
    .select()
    .from(oneTimeTokens)
    .where(live(purpose, token, now));
  if (!row) throw spent(purpose);
  return row;
}

/** Uses a token up; of two at the same time only one succeeds. */
export async function spendToken(db: Database, purpose: Purpose, token: string, now: Date) {
  const [row] = await db
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(live(purpose, token, now))
    .returning();
  if (!row) throw spent(purpose);
  return row;
}

const NEXT_STEP: Readonly<Record<Purpose, string>> = {
  'set-up': 'Start the server again: it prints a new one.',
  invitation: 'Ask your administrator to send the invitation again.',
  'password reset': 'Ask for a new one on the sign-in page.',
};

const spent = (purpose: Purpose) =>
  new Failure(
    'token.spent',
    410,
    'This link no longer works',
    `It was used already, has expired, or was replaced by a newer one. ${NEXT_STEP[purpose]}`,
  );
