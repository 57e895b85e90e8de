import { bigserial, date, index, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { ENTITIES, type Entity } from '../contract/vocabulary';
import { at, oneOf } from './columns';

/** Every change, in order, each entry holding the hash of the one before; rows are never changed or deleted. */
export const history = pgTable(
  'history',
  {
    seq: bigserial('seq', { mode: 'number' }).primaryKey(),
    siteId: uuid('site_id').notNull(),
    /** When it was recorded, by the server's clock. */
    at: at('at').notNull(),
    /** When it happened in the plant, where that is another day. */
    eventOn: date('event_on', { mode: 'string' }),
    actorId: uuid('actor_id'),
    actorName: text('actor_name').notNull(),
    actorRole: text('actor_role').notNull(),
    /** Entity and verb, e.g. `assessment.approved`. */
    action: text('action').notNull(),
    entity: text('entity').$type<Entity>().notNull(),
    entityId: uuid('entity_id').notNull(),
    componentId: uuid('component_id'),
    flawId: uuid('flaw_id'),
    /** One sentence a stranger understands. */
    summary: text('summary').notNull(),
    before: jsonb('before').$type<Readonly<Record<string, unknown>> | null>(),
    after: jsonb('after').$type<Readonly<Record<string, unknown>> | null>(),
    reason: text('reason').notNull().default(''),
    requestId: text('request_id').notNull().default(''),
    previousHash: text('previous_hash').notNull(),
    hash: text('hash').notNull(),
  },
  (t) => [
    index('history_component').on(t.componentId, t.seq),
    index('history_site').on(t.siteId, t.seq),
    index('history_entity').on(t.entity, t.entityId),
    oneOf('history_entity_word', t.entity, ENTITIES),
  ],
);
