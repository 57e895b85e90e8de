import * as z from 'zod';
import { id } from './primitives';
import { route } from './route';

export const searchHit = z.object({
  kind: z.enum(['component', 'location', 'flaw', 'inspection']),
  id,
  title: z.string(),
  subtitle: z.string(),
  link: z.string(),
});
export type SearchHit = z.infer<typeof searchHit>;

export const searchEverything = route({
  method: 'get',
  path: '/api/search',
  summary: 'Components, welds, flaws and inspections by tag, name, number or drawing',
  access: 'search.read',
  query: z.object({ q: z.string().trim().min(2).max(100) }),
  response: z.object({ items: z.array(searchHit) }),
});
