import type { Role } from '@ligament/domain/contract/policy';

/** The signed-in person on whose behalf a request acts. */
export interface Actor {
  readonly personId: string;
  readonly siteId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly competence: string;
  readonly sessionId: string;
  /** When the password was last given in this session. */
  readonly provedAt: Date;
  readonly requestId: string;
}

/** What the job runner and the seed act as. */
export const systemActor = (siteId: string) =>
  ({ siteId, personId: null, name: 'Ligament', role: 'system', requestId: '' }) as const;

/** Whoever a history entry names: a person, or the system itself. */
export interface HistoryActor {
  readonly siteId: string;
  readonly personId: string | null;
  readonly name: string;
  readonly role: string;
  readonly requestId: string;
}
