import * as z from 'zod';
import { ROLES } from './policy';
import { id, instant, isoDate, line, listQuery, optionalLine, page, version } from './primitives';
import { route } from './route';
import { email } from './session';

/** Where a person stands with their access. */
export const ACCESS_STATES = ['active', 'invited', 'access ended', 'disabled'] as const;
export type AccessState = (typeof ACCESS_STATES)[number];

export const PEOPLE_SORTS = [
  'name',
  '-name',
  'email',
  '-email',
  'role',
  '-role',
  'organisation',
  '-organisation',
  'certificateValidUntil',
  '-certificateValidUntil',
] as const;

export const person = z.object({
  id,
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  organisation: z.string(),
  competence: z.string().describe('Qualification in words, e.g. PAUT level 2'),
  certificateNo: z.string(),
  certificateValidUntil: z.string().nullable(),
  accessUntil: z
    .string()
    .nullable()
    .describe('Last day of access at the site’s date; null without end'),
  active: z.boolean(),
  access: z.enum(ACCESS_STATES),
  lockedUntil: instant.nullable().describe('Locked after failed sign-ins until then'),
  sessions: z.number().int().describe('Sessions open now'),
  lastSeenAt: instant.nullable(),
  version,
  createdAt: instant,
  updatedAt: instant,
});
export type Person = z.infer<typeof person>;

const personId = z.object({ id });

/** What an administrator records of a person, each with its check. */
export const personFacts = {
  name: line(120),
  role: z.enum(ROLES, { error: 'Choose a role.' }),
  organisation: optionalLine(120),
  competence: optionalLine(300),
  certificateNo: optionalLine(60),
  certificateValidUntil: isoDate.nullable(),
  accessUntil: isoDate.nullable(),
};

export const invitation = z.strictObject({
  ...personFacts,
  email,
  organisation: personFacts.organisation.default(''),
  competence: personFacts.competence.default(''),
  certificateNo: personFacts.certificateNo.default(''),
  certificateValidUntil: personFacts.certificateValidUntil.default(null),
  accessUntil: personFacts.accessUntil.default(null),
});

export const personChange = z.strictObject({ ...personFacts, active: z.boolean() }).partial();
export type PersonChange = z.infer<typeof personChange>;

export const listPeople = route({
  method: 'get',
  path: '/api/users',
  summary: 'People with access to the site',
  access: 'people.read',
  query: z.strictObject({
    ...listQuery,
    role: z.enum(ROLES).optional(),
    sort: z.enum(PEOPLE_SORTS).default('name'),
  }),
  response: page(person),
});

export const invitePerson = route({
  method: 'post',
  path: '/api/users',
  summary: 'Invite a person by e-mail; they choose their own password within 72 hours',
  access: 'people.write',
  body: invitation,
  response: person,
});

export const readPerson = route({
  method: 'get',
  path: '/api/users/:id',
  summary: 'One person',
  access: 'people.read',
  params: personId,
  response: person,
});

export const changePerson = route({
  method: 'patch',
  path: '/api/users/:id',
  summary: 'Change a person; another role or no access ends their sessions at once',
  access: 'people.write',
  params: personId,
  versioned: true,
  body: personChange,
  response: person,
});

export const resendInvitation = route({
  method: 'post',
  path: '/api/users/:id/invitation',
  summary: 'Send the invitation again; the earlier link stops working',
  access: 'people.write',
  params: personId,
  response: person,
});

export const endPersonSessions = route({
  method: 'post',
  path: '/api/users/:id/sessions/end',
  summary: 'End all sessions of a person',
  access: 'people.write',
  params: personId,
  status: 200,
  response: z.object({ ended: z.number().int() }),
});
