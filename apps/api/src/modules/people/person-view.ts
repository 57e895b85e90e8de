import type { AccessState, Person } from '@ligament/domain/contract/people';
import { notFound } from '../../http/failure';
import type { PersonRow, PersonWithSessions } from './people.repository';

/** A person as others on the site see them. */
export function personView(
  { person, sessions, lastSeenAt }: PersonWithSessions,
  now: Date,
  today: string,
): Person {
  const locked =
    person.lockedUntil !== null && person.lockedUntil > now ? person.lockedUntil : null;
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    role: person.role,
    organisation: person.organisation,
    competence: person.competence,
    certificateNo: person.certificateNo,
    certificateValidUntil: person.certificateValidUntil,
    accessUntil: person.accessUntil,
    active: person.active,
    access: accessState(person, today),
    lockedUntil: locked?.toISOString() ?? null,
    sessions,
    lastSeenAt: lastSeenAt?.toISOString() ?? null,
    version: person.version,
    createdAt: person.createdAt.toISOString(),
    updatedAt: person.updatedAt.toISOString(),
  };
}

function accessState(person: PersonRow, today: string): AccessState {
  if (!person.active) return 'disabled';
  if (person.accessUntil !== null && person.accessUntil < today) return 'access ended';
  return person.passwordHash === null ? 'invited' : 'active';
}

/** What the history keeps of a person. */
export const personSnapshot = (person: PersonRow) => ({
  name: person.name,
  email: person.email,
  role: person.role,
  organisation: person.organisation,
  competence: person.competence,
  certificateNo: person.certificateNo,
  certificateValidUntil: person.certificateValidUntil,
  accessUntil: person.accessUntil,
  active: person.active,
});

export const noSuchPerson = () => notFound('person');
