import type { Action } from '@ligament/domain/contract/policy';

export interface NavigationEntry {
  readonly label: string;
  readonly path: string;
  /** Shown only to roles that may do this. */
  readonly action: Action;
}

export interface NavigationGroup {
  readonly heading: string | null;
  readonly entries: readonly NavigationEntry[];
}

/** The rail, in plain words. */
export const NAVIGATION: readonly NavigationGroup[] = [
  {
    heading: null,
    entries: [
      { label: 'Today', path: '/today', action: 'today.read' },
      { label: 'Register', path: '/register', action: 'register.read' },
      { label: 'Inspections', path: '/inspections', action: 'inspections.read' },
      { label: 'Flaws', path: '/flaws', action: 'flaws.read' },
      { label: 'Schedule', path: '/schedule', action: 'reinspections.read' },
      { label: 'History', path: '/history', action: 'history.read' },
    ],
  },
  {
    heading: 'Site lists',
    entries: [
      { label: 'Materials', path: '/materials', action: 'register.read' },
      { label: 'Growth laws', path: '/growth-laws', action: 'register.read' },
      { label: 'Checks', path: '/checks', action: 'checks.read' },
      { label: 'Site rules', path: '/site-rules', action: 'rules.read' },
    ],
  },
  {
    heading: 'Administration',
    entries: [
      { label: 'People', path: '/people', action: 'people.read' },
      { label: 'Mailbox', path: '/mailbox', action: 'mail.read' },
    ],
  },
];

const NEAREST_PATHS = ['/today', '/inspections', '/flaws', '/schedule'];

/** What inspectors and planners open in the field. */
export const NEAREST: readonly NavigationEntry[] = NAVIGATION.flatMap(
  (group) => group.entries,
).filter((entry) => NEAREST_PATHS.includes(entry.path));
