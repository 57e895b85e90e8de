import type { Role } from '@ligament/domain/contract/policy';
import { people } from '@ligament/domain/schema/people';
import { and, eq, gte, inArray, isNull, or } from 'drizzle-orm';
import type { Database } from '../../db/database';

export interface Recipient {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

/** Who is reminded at a site: planners and engineers, and inspectors when the crew has to be booked. */
export const reminderRecipients = (
  db: Database,
  siteId: string,
  today: string,
): Promise<Recipient[]> =>
  db
    .select({ id: people.id, name: people.name, email: people.email, role: people.role })
    .from(people)
    .where(
      and(
        eq(people.siteId, siteId),
        eq(people.active, true),
        inArray(people.role, ['planner', 'engineer', 'inspector']),
        or(isNull(people.accessUntil), gte(people.accessUntil, today)),
      ),
    );
