import * as z from 'zod';
import { id, instant, isoDate, listQuery, page } from './primitives';
import { route } from './route';
import { ENTITIES } from './vocabulary';

const snapshot = z.record(z.string(), z.unknown()).nullable();

export const historyEntry = z.object({
  seq: z.number().int().describe('Place in the order of recording'),
  at: instant.describe('When it was recorded, by the server’s clock'),
  eventOn: z
    .string()
    .nullable()
    .describe('When it happened in the plant, where that is another day'),
  actor: z.object({ id: id.nullable(), name: z.string(), role: z.string() }),
  action: z.string(),
  entity: z.enum(ENTITIES),
  entityId: id,
  componentId: id.nullable(),
  componentTag: z.string().nullable(),
  flawId: id.nullable(),
  flawNo: z.string().nullable(),
  summary: z.string(),
  before: snapshot.describe('Of what changed, the state before'),
  after: snapshot.describe('Of what changed, the state after'),
  reason: z.string(),
  requestId: z.string(),
  hash: z.string().describe('SHA-256 of this entry chained to the one before it'),
});
export type HistoryEntry = z.infer<typeof historyEntry>;

const filters = {
  search: listQuery.search,
  entity: z.enum(ENTITIES).optional(),
  actor: z.union([id, z.literal('system')]).optional(),
  from: isoDate.optional().describe('First day, at the site’s date'),
  to: isoDate.optional().describe('Last day, at the site’s date'),
  flaw: id.optional(),
};

export const historyFilters = z.strictObject({ ...filters, component: id.optional() });

export const listHistory = route({
  method: 'get',
  path: '/api/history',
  summary: 'Everything that was recorded at the site, newest first',
  access: 'history.read',
  query: z.strictObject({
    ...historyFilters.shape,
    cursor: listQuery.cursor,
    limit: listQuery.limit,
  }),
  response: page(historyEntry),
});

export const listComponentHistory = route({
  method: 'get',
  path: '/api/components/:id/history',
  summary:
    'Whole life of one component with its flaws, assessments, inspections and re-inspections, newest first',
  access: 'history.read',
  params: z.object({ id }),
  query: z.strictObject({ ...filters, cursor: listQuery.cursor, limit: listQuery.limit }),
  response: page(historyEntry),
});

export const listHistoryActors = route({
  method: 'get',
  path: '/api/history/actors',
  summary: 'Who stands in the history',
  access: 'history.read',
  query: z.strictObject({ component: id.optional() }),
  response: z.object({ rows: z.array(z.object({ id: z.string(), name: z.string() })) }),
});

export const ANCHOR_STATES = ['stands', 'differs', 'missing'] as const;

export const historyVerification = z.object({
  entries: z.number().int(),
  valid: z.boolean(),
  firstBreak: z.object({ seq: z.number().int(), why: z.string() }).nullable(),
  head: z.object({ seq: z.number().int(), hash: z.string() }).nullable(),
  anchor: z
    .enum(ANCHOR_STATES)
    .nullable()
    .describe('Whether the head noted earlier still stands in the chain; null when none was given'),
});
export type HistoryVerification = z.infer<typeof historyVerification>;

export const verifyHistory = route({
  method: 'get',
  path: '/api/history/verify',
  summary: 'Recompute the chain of hashes over all entries and say where it first breaks',
  access: 'history.verify',
  query: z.strictObject({
    noted: z
      .string()
      .regex(/^\d{1,15}:[0-9a-f]{64}$/, {
        error: 'A noted head is its number, a colon and 64 characters 0–9, a–f.',
      })
      .optional()
      .describe(
        'Head noted earlier, as number:hash; shows whether entries were cut off the end since',
      ),
  }),
  response: historyVerification,
});

export const exportHistory = route({
  method: 'get',
  path: '/api/history.csv',
  summary: 'The history as CSV (RFC 4180), newest first, with the filters of the list',
  access: 'history.read',
  query: historyFilters,
  response: z.string(),
});
