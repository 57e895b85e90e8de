import {
  acceptInvitation as acceptInvitationRoute,
  readSetup,
  requestPasswordReset as requestPasswordResetRoute,
  resetPassword as resetPasswordRoute,
  setUp as setUpRoute,
} from '@ligament/domain/contract/session';
import type { Deps } from '../../deps';
import { limitPerMinute } from '../../http/rate-limit';
import { requestId } from '../../http/request-id';
import type { Api } from '../../http/serve';
import { acceptInvitation } from './accept-invitation';
import { accountRepository } from './account.repository';
import { sourceOf } from './request-source';
import { requestPasswordReset, resetPassword } from './reset-password';
import { serveSessions } from './session.routes';
import { setUp } from './set-up';

const TRIES_PER_MINUTE = 300;

/** Everything by which people get in: sessions, first set-up, invitations, password resets. */
export function serveAuth(api: Api, deps: Deps): void {
  const limited = limitPerMinute(TRIES_PER_MINUTE);
  serveSessions(api, deps, limited);

  api.serve(readSetup, async () => ({ needed: !(await accountRepository(deps.db).anybody()) }));

  api.serve(
    setUpRoute,
    async ({ body, request, response }) => {
      const source = { ...sourceOf(request), requestId: requestId(response) };
      const { view, setCookie } = await setUp(deps, body, source);
      response.setHeader('Set-Cookie', setCookie);
      return view;
    },
    limited,
  );

  api.serve(
    requestPasswordResetRoute,
    ({ body }) => requestPasswordReset(deps, body.email),
    limited,
  );

  api.serve(
    resetPasswordRoute,
    ({ params, body, response }) =>
      resetPassword(deps, params.token, body.password, requestId(response)),
    limited,
  );

  api.serve(
    acceptInvitationRoute,
    async ({ params, body, actor, request, response }) => {
      const { view, setCookie } = await acceptInvitation(deps, params.token, body, {
        ...sourceOf(request),
        requestId: requestId(response),
        previousSessionId: actor?.sessionId ?? null,
      });
      response.setHeader('Set-Cookie', setCookie);
      return view;
    },
    limited,
  );
}
