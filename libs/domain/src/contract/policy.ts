/** Roles a person can hold, one each. */
export const ROLES = [
  'inspector',
  'engineer',
  'planner',
  'operations',
  'auditor',
  'administrator',
] as const;
export type Role = (typeof ROLES)[number];

const EVERYBODY: readonly Role[] = ROLES;
const READERS = EVERYBODY;

/**
 * Who may do what: one row an action, one table for server and screens. An action that is not listed is refused.
 * Rules that depend on the record (an author never approves their own work) are checked where the record is.
 */
const POLICY = {
  'session.own': EVERYBODY,
  'register.read': READERS,
  'register.write': ['engineer', 'administrator'],
  'site.write': ['administrator'],
  'materials.write': ['engineer', 'administrator'],
  'inspections.read': READERS,
  'inspections.plan': ['engineer', 'planner', 'inspector'],
  'inspections.write': ['inspector', 'engineer'],
  'inspections.accept': ['engineer'],
  'imports.read': ['inspector', 'engineer', 'auditor'],
  'imports.write': ['inspector', 'engineer'],
  'documents.read': READERS,
  'documents.write': ['inspector', 'engineer', 'planner', 'operations'],
  'flaws.read': READERS,
  'flaws.match': ['inspector', 'engineer'],
  'flaws.write': ['engineer'],
  'assessments.read': READERS,
  'assessments.preview': ['inspector', 'engineer'],
  'assessments.write': ['engineer'],
  'assessments.review': ['engineer'],
  'reinspections.read': READERS,
  'reinspections.plan': ['planner'],
  'windows.read': READERS,
  'windows.write': ['planner'],
  'reminders.read': ['engineer', 'planner', 'operations', 'auditor', 'administrator'],
  'reminders.acknowledge': ['engineer', 'planner', 'inspector', 'operations'],
  'reminders.run': ['planner', 'administrator'],
  'operations.acknowledge': ['operations'],
  'history.read': READERS,
  'history.verify': ['engineer', 'auditor', 'administrator'],
  'people.read': ['engineer', 'planner', 'auditor', 'administrator'],
  'people.write': ['administrator'],
  'rules.read': READERS,
  'rules.write': ['administrator'],
  'mail.read': ['planner', 'auditor', 'administrator'],
  'checks.read': READERS,
  'search.read': READERS,
  'today.read': READERS,
} as const satisfies Record<string, readonly Role[]>;

export type Action = keyof typeof POLICY;
export const ACTIONS = Object.keys(POLICY) as readonly Action[];

/** Whether a role may do an action at all. */
export function may(role: Role, action: Action): boolean {
  const roles: readonly Role[] = POLICY[action];
  return roles.includes(role);
}
