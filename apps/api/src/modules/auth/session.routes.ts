import {
  changePassword as changePasswordRoute,
  endSession,
  listSessions,
  proveIdentity as proveIdentityRoute,
  readSession,
  signIn as signInRoute,
  signOut,
} from '@ligament/domain/contract/session';
import type { RequestHandler } from 'express';
import type { Deps } from '../../deps';
import { notFound } from '../../http/failure';
import { logSecurity } from '../../http/security-log';
import type { Api } from '../../http/serve';
import { changePassword, proveIdentity } from './change-password';
import { sourceOf } from './request-source';
import { sessionStore } from './session-store';
import { sessionView } from './session-view';
import { signIn } from './sign-in';

/** Signing in and out, and what a person does with their own sessions and password. */
export function serveSessions(api: Api, deps: Deps, limited: RequestHandler): void {
  const store = sessionStore(deps.db, deps.clock);

  api.serve(
    signInRoute,
    async ({ body, actor, request, response }) => {
      const source = { ...sourceOf(request), previousSessionId: actor?.sessionId ?? null };
      const { view, setCookie } = await signIn(deps, body, source);
      response.setHeader('Set-Cookie', setCookie);
      return view;
    },
    limited,
  );

  api.serve(readSession, ({ actor }) => sessionView(deps.db, actor.sessionId));

  api.serve(signOut, async ({ actor, response }) => {
    await store.end(actor.sessionId);
    logSecurity(deps.log, 'sign-out', { personId: actor.personId });
    response.setHeader('Set-Cookie', store.blankCookie());
    response.setHeader('Clear-Site-Data', '"cache", "cookies", "storage"');
  });

  api.serve(
    proveIdentityRoute,
    ({ body, actor, request }) =>
      proveIdentity(deps, actor, body.password, sourceOf(request).address),
    limited,
  );

  api.serve(
    changePasswordRoute,
    async ({ body, actor, request, response }) => {
      const { setCookie } = await changePassword(deps, actor, body, sourceOf(request));
      response.setHeader('Set-Cookie', setCookie);
    },
    limited,
  );

  api.serve(listSessions, async ({ actor }) => ({
    rows: (await store.listOf(actor.personId)).map((row) => ({
      id: row.id,
      current: row.id === actor.sessionId,
      createdAt: row.createdAt.toISOString(),
      lastSeenAt: row.lastSeenAt.toISOString(),
      userAgent: row.userAgent,
      address: row.address,
    })),
  }));

  api.serve(endSession, async ({ params, actor }) => {
    const own = (await store.listOf(actor.personId)).some((row) => row.id === params.id);
    if (!own) throw notFound('session');
    await store.end(params.id);
    logSecurity(deps.log, 'sessions ended', { personId: actor.personId, by: actor.personId });
  });
}
