import { people } from '@ligament/domain/schema/people';
import { eq } from 'drizzle-orm';
import { settableClock } from '../../apps/api/src/clock';
import type { Deps } from '../../apps/api/src/deps';
import type { Actor } from '../../apps/api/src/http/actor';
import { openSite } from '../../apps/api/src/modules/auth/open-site';
import { hashPassword } from '../../apps/api/src/modules/auth/password-hash';
import { DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from '../plant/people';
import { SITE } from '../plant/site';
import type { DateMover } from './dates';

/** The plant while it is being replayed: a clock that is set to each day, and its people to act. */
export interface Stage {
  readonly deps: Deps;
  readonly siteId: string;
  readonly dates: DateMover;
  /** Sets the clock to mid-morning of a day; several acts of one day follow each other by minutes. */
  readonly goTo: (day: string) => void;
  readonly actor: (key: string) => Actor;
}

/** Opens the site on its first day and lets its people in. */
export async function openStage(deps: Deps, dates: DateMover, firstDay: string): Promise<Stage> {
  const clock = settableClock(new Date(`${firstDay}T08:00:00Z`));
  let day = firstDay;
  let minutes = 0;
  const staged: Deps = {
    ...deps,
    clock: {
      now: () => {
        minutes += 1;
        return new Date(clock.now().getTime() + minutes * 60_000);
      },
    },
  };
  const siteId = await deps.db.transaction((tx) =>
    openSite(
      tx,
      clock.now(),
      { name: 'Ligament', role: 'system', personId: null, requestId: '' },
      { ...SITE, demo: true },
    ),
  );
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const actors = new Map<string, Actor>();
  for (const person of DEMO_PEOPLE) {
    actors.set(person.key, await admit(staged, siteId, person, passwordHash, clock.now(), dates));
  }
  return {
    deps: staged,
    siteId,
    dates,
    goTo: (to) => {
      if (to !== day) minutes = 0;
      day = to;
      clock.set(new Date(`${to}T09:00:00Z`));
    },
    actor: (key) => {
      const found = actors.get(key);
      if (!found) throw new Error(`nobody is called ${key}`);
      return found;
    },
  };
}

async function admit(
  { db }: Deps,
  siteId: string,
  person: DemoPerson,
  passwordHash: string,
  now: Date,
  dates: DateMover,
): Promise<Actor> {
  const { key: _key, certificateValidUntil, accessUntil, ...values } = person;
  await db.insert(people).values({
    ...values,
    siteId,
    passwordHash,
    certificateValidUntil: certificateValidUntil ? dates.move(certificateValidUntil) : null,
    accessUntil: accessUntil ? dates.move(accessUntil) : null,
    createdAt: now,
    updatedAt: now,
  });
  const [row] = await db.select().from(people).where(eq(people.email, person.email));
  if (!row) throw new Error(`${person.name} was not admitted`);
  return {
    personId: row.id,
    siteId,
    name: row.name,
    email: row.email,
    role: row.role,
    competence: row.competence,
    sessionId: '',
    provedAt: now,
    requestId: '',
  };
}
