import type { Role } from '@ligament/domain/contract/policy';

/** What a role may do, for whoever gives it. */
export const ROLE_WORDS: Readonly<Record<Role, string>> = {
  inspector: 'uploads and corrects inspection files, hands inspections over',
  engineer: 'assesses flaws, accepts inspections, checks the work of other engineers',
  planner: 'plans re-inspections and shutdown windows, receives reminders',
  operations: 'acknowledges operating limits and due dates',
  auditor: 'reads everything, proves and exports the history, changes nothing',
  administrator: 'invites people, gives roles, keeps the site’s lists and rules',
};
