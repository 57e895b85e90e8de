import * as z from 'zod';
import { isoDate } from './primitives';
import { route } from './route';

export const todayItem = z.object({
  title: z.string(),
  subtitle: z.string(),
  why: z.string(),
  link: z.string(),
  tone: z.enum(['bad', 'warn', 'plain']),
});
export type TodayItem = z.infer<typeof todayItem>;

export const todayGroup = z.object({
  key: z.string(),
  title: z.string(),
  count: z.number().int(),
  /** Opens the list behind the count. */
  link: z.string(),
  items: z.array(todayItem),
});
export type TodayGroup = z.infer<typeof todayGroup>;

export const readToday = route({
  method: 'get',
  path: '/api/today',
  summary: 'What needs the signed-in person, the most pressing first',
  access: 'today.read',
  response: z.object({ today: isoDate, groups: z.array(todayGroup) }),
});
