import * as z from 'zod';
import { route } from './route';

export const readHealth = route({
  method: 'get',
  path: '/api/health',
  summary: 'Whether the server and its database answer; 503 when they do not',
  access: 'public',
  response: z.object({
    status: z.enum(['ok', 'degraded']),
    database: z.enum(['up', 'down']),
    version: z.string(),
  }),
});
