import {
  boolean,
  date,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  uuid,
} from 'drizzle-orm/pg-core';
import { ROLES, type Role } from '../contract/policy';
import { at, createdAt, key, oneOf, updatedAt, version } from './columns';
import { sites } from './sites';

export const people = pgTable(
  'people',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    name: text('name').notNull(),
    /** Always lower case. */
    email: text('email').notNull().unique(),
    role: text('role').$type<Role>().notNull(),
    organisation: text('organisation').notNull().default(''),
    competence: text('competence').notNull().default(''),
    certificateNo: text('certificate_no').notNull().default(''),
    certificateValidUntil: date('certificate_valid_until', { mode: 'string' }),
    /** Last day of access, for visitors such as an auditor. */
    accessUntil: date('access_until', { mode: 'string' }),
    /** Argon2id, null until the invitation is accepted. */
    passwordHash: text('password_hash'),
    active: boolean('active').notNull().default(true),
    failedSignIns: integer('failed_sign_ins').notNull().default(0),
    lockedUntil: at('locked_until'),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [oneOf('people_role', t.role, ROLES), index('people_site').on(t.siteId)],
);

/** Only the SHA-256 of the session identifier is kept: a leaked backup opens no session. */
export const sessions = pgTable(
  'sessions',
  {
    id: text('id').primaryKey(),
    userId: uuid('user_id')
      .notNull()
      .references(() => people.id),
    expiresAt: at('expires_at').notNull(),
    absoluteExpiresAt: at('absolute_expires_at').notNull(),
    createdAt: createdAt(),
    lastSeenAt: at('last_seen_at').notNull().defaultNow(),
    /** When the password was last given in this session. */
    provedAt: at('proved_at').notNull().defaultNow(),
    userAgent: text('user_agent').notNull().default(''),
    address: text('address').notNull().default(''),
  },
  (t) => [index('sessions_user').on(t.userId)],
);

/** One-time tokens (set-up, invitation, password reset), kept as SHA-256. */
export const oneTimeTokens = pgTable('one_time_tokens', {
  tokenHash: text('token_hash').primaryKey(),
  purpose: text('purpose').$type<'set-up' | 'invitation' | 'password reset'>().notNull(),
  personId: uuid('person_id').references(() => people.id),
  expiresAt: at('expires_at').notNull(),
  usedAt: at('used_at'),
  createdAt: createdAt(),
});

/** Failures counted per key (an address, an account) over a window; survives a restart. */
export const throttles = pgTable('throttles', {
  key: text('key').primaryKey(),
  failures: integer('failures').notNull(),
  windowStartedAt: at('window_started_at').notNull(),
});

/** Answers kept so that a repeated request does the work once. */
export const idempotencyKeys = pgTable(
  'idempotency_keys',
  {
    key: text('key').notNull(),
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id),
    route: text('route').notNull(),
    requestHash: text('request_hash').notNull(),
    status: integer('status').notNull(),
    answer: text('answer').notNull(),
    createdAt: createdAt(),
  },
  (t) => [primaryKey({ columns: [t.personId, t.key] })],
);
