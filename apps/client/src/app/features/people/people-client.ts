import { inject, Injectable } from '@angular/core';
import {
  changePerson,
  endPersonSessions,
  invitePerson,
  listPeople,
  type Person,
  readPerson,
  resendInvitation,
} from '@ligament/domain/contract/people';
import type { BodyOf, QueryOf } from '@ligament/domain/contract/route';
import { ApiClient } from '../../core/http/api-client';

/** People of the site. */
@Injectable({ providedIn: 'root' })
export class PeopleClient {
  private readonly api = inject(ApiClient);

  list(query: QueryOf<typeof listPeople>) {
    return this.api.call(listPeople, { query });
  }

  read(id: string) {
    return this.api.call(readPerson, { params: { id } });
  }

  invite(body: BodyOf<typeof invitePerson>, idempotencyKey: string) {
    return this.api.call(invitePerson, { body, idempotencyKey });
  }

  change(id: string, version: number, body: BodyOf<typeof changePerson>) {
    return this.api.call(changePerson, { params: { id }, version, body });
  }

  resend({ id }: Person) {
    return this.api.call(resendInvitation, { params: { id }, body: {} });
  }

  endSessions({ id }: Person) {
    return this.api.call(endPersonSessions, { params: { id }, body: {} });
  }
}
