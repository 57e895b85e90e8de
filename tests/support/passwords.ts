import { people } from '@ligament/domain/schema/people';
import { eq } from 'drizzle-orm';
import { hashPassword } from '../../apps/api/src/modules/auth/password-hash';
import type { TestPerson, TestPlant } from './test-plant';

/** Long, and of nobody’s name. */
export const GOOD_PASSWORD = 'seven kettles boil at dawn';

/** Lets a test person sign in. */
export async function givePassword(
  { db }: Pick<TestPlant, 'db'>,
  person: TestPerson,
  password = GOOD_PASSWORD,
): Promise<void> {
  const passwordHash = await hashPassword(password);
  await db.update(people).set({ passwordHash }).where(eq(people.id, person.id));
}

/** The cookie an answer sets, as a browser would send it back; empty when it sets none. */
export function cookieOf(response: { headers: Record<string, unknown> }): string {
  const set = response.headers['set-cookie'];
  const first: unknown = Array.isArray(set) ? set[0] : set;
  return typeof first === 'string' ? (first.split(';')[0] ?? '') : '';
}
