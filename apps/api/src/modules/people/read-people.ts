import type { listPeople as listRoute, Person } from '@ligament/domain/contract/people';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import type { Deps } from '../../deps';
import { cutPage } from '../../http/cursor';
import { siteDay } from '../../http/site-day';
import { peopleRepository } from './people.repository';
import { noSuchPerson, personView } from './person-view';

/** One page of the people of a site. */
export async function listPeople(
  { db, clock }: Deps,
  siteId: string,
  query: z.output<typeof listRoute.query>,
) {
  const now = clock.now();
  const repository = peopleRepository(db);
  const found = await repository.list(siteId, query, now);
  const { rows, nextCursor } = cutPage(found, query.limit, (row) => [row.sortText, row.person.id]);
  const today = await siteToday(db, siteId, now);
  return {
    rows: rows.map((row) => personView({ ...row, sessions: row.sessions ?? 0 }, now, today)),
    nextCursor,
  };
}

/** One person of the site, as it stands in the database or in a transaction. */
export async function readPerson(
  db: Database,
  siteId: string,
  id: string,
  now: Date,
): Promise<Person> {
  const found = await peopleRepository(db).byId(siteId, id, now);
  if (!found) throw noSuchPerson();
  return personView(found, now, await siteToday(db, siteId, now));
}

/** The calendar date at the site. */
export async function siteToday(db: Database, siteId: string, now: Date): Promise<string> {
  const site = await peopleRepository(db).siteOf(siteId);
  return siteDay(now, site?.timeZone ?? 'UTC');
}
