import { password } from '@ligament/domain/contract/session';
import { people } from '@ligament/domain/schema/people';
import { hash } from '@node-rs/argon2';
import { eq } from 'drizzle-orm';
import { COMMON_PASSWORDS } from '../../../apps/api/src/modules/auth/common-passwords';
import {
  hashPassword,
  needsRehash,
  verifyPassword,
} from '../../../apps/api/src/modules/auth/password-hash';
import { weakness } from '../../../apps/api/src/modules/auth/password-rules';
import { GOOD_PASSWORD } from '../../support/passwords';
import { as, testPlant } from '../../support/test-plant';

const CONTEXT = {
  name: 'Amara Lindqvist-Obi',
  email: 'a.obi.team@example.org',
  siteName: 'Saltmere Works',
};

describe('passwords', () => {
  it.each([
    ['fourteen chars', 'abcdefgh ijklm', false],
    ['fifteen characters', 'abcdefgh ijklmn', true],
    ['spaces only at the ends', ' a long sentence ', true],
    ['no digits, no capitals, no marks', 'kettles boil slowly at dawn', true],
    ['accents and other scripts', 'Ärger über größere Öfen', true],
    ['Chinese', '今天天气很好我们一起去公园散步吧好吗', true],
    ['emoji', '🦊🦊🦊 jump over 🐢🐢', true],
    ['quotes and SQL', `'; drop table people; --`, true],
    ['128 characters', 'ab cd'.repeat(25) + 'xyz', true],
    ['256 characters', 'abcd'.repeat(64), true],
    ['257 characters', 'abcd'.repeat(64) + 'x', false],
    ['empty', '', false],
  ])('by length alone: %s', (_name, text, legal) => {
    expect(password.safeParse(text).success).toBe(legal);
  });

  it('are never cut: the 73rd and the 200th character count', async () => {
    for (const length of [72, 200]) {
      const kept = await hashPassword('p'.repeat(length));
      expect(await verifyPassword(kept, 'p'.repeat(length))).toBe(true);
      expect(await verifyPassword(kept, `${'p'.repeat(length)}x`)).toBe(false);
    }
  });

  it('are the same whether a letter is composed or typed with a combining mark', async () => {
    const kept = await hashPassword('größere Öfen brennen länger');
    expect(await verifyPassword(kept, 'größere Öfen brennen länger'.normalize('NFD'))).toBe(true);
  });

  it('are kept as Argon2id with at least 64 MiB, and weaker hashes are known as such', async () => {
    const kept = await hashPassword(GOOD_PASSWORD);
    expect(kept).toMatch(/^\$argon2id\$v=19\$m=65536,t=4,p=1\$/);
    expect(needsRehash(kept)).toBe(false);
    const weaker = await hash(GOOD_PASSWORD, {
      algorithm: 2,
      memoryCost: 19_456,
      timeCost: 2,
      parallelism: 1,
    });
    expect(needsRehash(weaker)).toBe(true);
    expect(needsRehash('$2b$12$abcdefghijklmnopqrstuv')).toBe(true);
  });

  it('are refused when common: more than 3000 of legal length', () => {
    expect(COMMON_PASSWORDS.size).toBeGreaterThan(3000);
    for (const common of COMMON_PASSWORDS) {
      expect(common.length).toBeGreaterThanOrEqual(15);
      expect({ common, refused: weakness(common, CONTEXT) !== null }).toEqual({
        common,
        refused: true,
      });
      if (weakness(common.toUpperCase(), CONTEXT) === null)
        throw new Error(`${common} in capitals passes`);
    }
  });

  it.each([
    'aaaaaaaaaaaaaaaaaaa',
    'abcabcabcabcabcabc',
    'I am amara and I like it',
    'lindqvist on the hill',
    'A. Obi Team wins again',
    'down at saltmere pier',
    'SALTMERE-WORKS rules',
    'ligament ligament ok',
    'Liga-Ment forever and ever',
  ])('are refused when guessable for this person: %s', (text) => {
    expect(weakness(text, CONTEXT)).not.toBeNull();
  });

  it.each([
    'seven kettles boil at dawn',
    'the works canteen serves soup',
    'look again in time',
    'x9 Qf 77 long enough',
  ])('are accepted otherwise: %s', (text) => {
    expect(weakness(text, CONTEXT)).toBeNull();
  });

  it('get a stronger hash when somebody signs in with a weaker one', async () => {
    const plant = await testPlant();
    const weaker = await hash(GOOD_PASSWORD, {
      algorithm: 2,
      memoryCost: 19_456,
      timeCost: 2,
      parallelism: 1,
    });
    await plant.db
      .update(people)
      .set({ passwordHash: weaker })
      .where(eq(people.id, plant.planner.id));
    const answer = await as(plant.app, null)
      .post('/api/session')
      .send({ email: plant.planner.email.toUpperCase(), password: GOOD_PASSWORD });
    expect(answer.status).toBe(201);
    const [row] = await plant.db.select().from(people).where(eq(people.id, plant.planner.id));
    expect(row?.passwordHash).toMatch(/m=65536,t=4/);
    expect(await verifyPassword(row?.passwordHash ?? null, GOOD_PASSWORD)).toBe(true);
    await plant.close();
  }, 30_000);
});
