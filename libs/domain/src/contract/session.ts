import * as z from 'zod';
import { ROLES } from './policy';
import { id, instant, line } from './primitives';
import { route } from './route';

/** Passwords: any characters, long rather than clever, never truncated (at least 15 characters without a second factor). */
export const password = z
  .string({ error: 'Give a password.' })
  .min(15, { error: 'Use at least 15 characters; a sentence is fine.' })
  .max(256, { error: 'Use at most 256 characters.' });

export const email = z
  .email({ error: 'Give an e-mail address such as name@example.org.' })
  .max(254)
  .transform((address) => address.toLowerCase());

export const sessionView = z.object({
  user: z.object({
    id,
    name: z.string(),
    email: z.string(),
    role: z.enum(ROLES),
    organisation: z.string(),
  }),
  site: z.object({
    id,
    code: z.string(),
    name: z.string(),
    timeZone: z.string(),
    demo: z.boolean(),
  }),
  expiresAt: instant,
});
export type SessionView = z.infer<typeof sessionView>;

const token = z.object({ token: z.string().min(20).max(200) });

export const signIn = route({
  method: 'post',
  path: '/api/session',
  summary: 'Sign in with e-mail and password',
  access: 'public',
  body: z.strictObject({ email, password: z.string().min(1).max(1024) }),
  response: sessionView,
});

export const readSession = route({
  method: 'get',
  path: '/api/session',
  summary: 'Who is signed in',
  access: 'session.own',
  response: sessionView,
});

export const signOut = route({
  method: 'delete',
  path: '/api/session',
  summary: 'Sign out',
  access: 'session.own',
});

export const proveIdentity = route({
  method: 'post',
  path: '/api/session/proof',
  summary: 'Give the password again before a sign-off; good for five minutes',
  access: 'session.own',
  body: z.strictObject({ password: z.string().min(1).max(1024) }),
});

export const changePassword = route({
  method: 'post',
  path: '/api/session/password',
  summary: 'Change one’s own password',
  access: 'session.own',
  body: z.strictObject({ current: z.string().min(1).max(1024), next: password }),
});

export const sessionEntry = z.object({
  id: z.string(),
  current: z.boolean(),
  createdAt: instant,
  lastSeenAt: instant,
  userAgent: z.string(),
  address: z.string(),
});

export const listSessions = route({
  method: 'get',
  path: '/api/sessions',
  summary: 'One’s own sessions',
  access: 'session.own',
  response: z.object({ rows: z.array(sessionEntry) }),
});

export const endSession = route({
  method: 'delete',
  path: '/api/sessions/:id',
  summary: 'End one of one’s own sessions',
  access: 'session.own',
  params: z.object({ id: z.string().min(8).max(128) }),
});

export const readSetup = route({
  method: 'get',
  path: '/api/setup',
  summary: 'Whether the first administrator is still to be created',
  access: 'public',
  response: z.object({ needed: z.boolean() }),
});

export const setUp = route({
  method: 'post',
  path: '/api/setup',
  summary: 'Create the site and its first administrator with the one-time token printed at start',
  access: 'public',
  body: z.strictObject({
    token: z.string().min(20).max(200),
    siteName: line(120),
    siteCode: line(20),
    timeZone: line(60),
    name: line(120),
    email,
    password,
  }),
  response: sessionView,
});

export const requestPasswordReset = route({
  method: 'post',
  path: '/api/password-resets',
  summary:
    'Ask for a password reset by e-mail; the answer never tells whether the address is known',
  access: 'public',
  status: 202,
  body: z.strictObject({ email }),
  response: z.object({ detail: z.string() }),
});

export const resetPassword = route({
  method: 'post',
  path: '/api/password-resets/:token',
  summary: 'Set a new password with the token of the e-mail; ends all sessions',
  access: 'public',
  params: token,
  body: z.strictObject({ password }),
});

export const acceptInvitation = route({
  method: 'post',
  path: '/api/invitations/:token/accept',
  summary: 'Accept an invitation: choose a name and a password',
  access: 'public',
  params: token,
  body: z.strictObject({ name: line(120), password }),
  response: sessionView,
});
