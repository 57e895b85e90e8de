import type { Logger } from 'pino';

/** Events a security officer looks for. */
export type SecurityEvent =
  | 'sign-in'
  | 'sign-in refused'
  | 'account locked'
  | 'address limited'
  | 'sign-out'
  | 'sessions ended'
  | 'password changed'
  | 'password reset asked'
  | 'password reset'
  | 'invitation accepted'
  | 'site set up'
  | 'denied'
  | 'export';

const QUIET: ReadonlySet<SecurityEvent> = new Set([
  'sign-in',
  'sign-out',
  'password reset asked',
  'invitation accepted',
  'export',
]);

/**
 * Writes a line of the security log: identifiers and addresses, never a password, token or cookie. It is one line of
 * JSON, in which control characters are escaped, so that input cannot forge a line.
 */
export function logSecurity(
  log: Logger,
  event: SecurityEvent,
  facts: Readonly<Record<string, string | number>>,
): void {
  log[QUIET.has(event) ? 'info' : 'warn']({ security: event, ...facts }, event);
}
