import {
  changePerson as changePersonRoute,
  endPersonSessions,
  invitePerson as invitePersonRoute,
  listPeople as listPeopleRoute,
  readPerson as readPersonRoute,
  resendInvitation as resendInvitationRoute,
} from '@ligament/domain/contract/people';
import type { Deps } from '../../deps';
import { etag, type Api } from '../../http/serve';
import { changePerson } from './change-person';
import { endSessions } from './end-sessions';
import { invitePerson, resendInvitation } from './invite-person';
import { listPeople, readPerson } from './read-people';

/** People of the site and their access. */
export function servePeople(api: Api, deps: Deps): void {
  api.serve(listPeopleRoute, ({ actor, query }) => listPeople(deps, actor.siteId, query));

  api.serve(invitePersonRoute, async ({ actor, body, response }) => {
    const person = await invitePerson(deps, actor, body);
    response.setHeader('ETag', etag(person.version));
    return person;
  });

  api.serve(readPersonRoute, async ({ actor, params, response }) => {
    const person = await readPerson(deps.db, actor.siteId, params.id, deps.clock.now());
    response.setHeader('ETag', etag(person.version));
    return person;
  });

  api.serve(changePersonRoute, async ({ actor, params, body, seen, response }) => {
    const person = await changePerson(deps, actor, params.id, seen, body);
    response.setHeader('ETag', etag(person.version));
    return person;
  });

  api.serve(resendInvitationRoute, ({ actor, params }) => resendInvitation(deps, actor, params.id));

  api.serve(endPersonSessions, ({ actor, params }) => endSessions(deps, actor, params.id));
}
