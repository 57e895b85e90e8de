import type { Role } from '@ligament/domain/contract/policy';

/** A person of the demonstration plant; all are invented, all mail addresses use a reserved domain. */
export interface DemoPerson {
  readonly key: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly organisation: string;
  readonly competence: string;
  readonly certificateNo?: string;
  readonly certificateValidUntil?: string;
  readonly accessUntil?: string;
}

/** Printed at the start of the demonstration; it opens nothing but the invented plant. */
export const DEMO_PASSWORD = 'look again in time';

export const DEMO_PEOPLE: readonly DemoPerson[] = [
  {
    key: 'ines',
    name: 'Ines Vaarala',
    email: 'ines.vaarala@example.org',
    role: 'inspector',
    organisation: 'Northgate Inspection Services',
    competence: 'UT, PAUT and TOFD level 2',
    certificateNo: 'INV-0457',
    certificateValidUntil: '2027-01-31',
  },
  {
    key: 'tomas',
    name: 'Tomas Kerrow',
    email: 'tomas.kerrow@example.org',
    role: 'engineer',
    organisation: 'Brackwater Process Ltd',
    competence: 'Fitness-for-service assessment, crack-like flaws; valid to 2028-06-30',
  },
  {
    key: 'amara',
    name: 'Amara Lindqvist-Obi',
    email: 'amara.lindqvist-obi@example.org',
    role: 'engineer',
    organisation: 'Brackwater central engineering',
    competence: 'Fitness-for-service review, fracture mechanics; valid to 2029-03-31',
  },
  {
    key: 'joost',
    name: 'Joost Pellam',
    email: 'joost.pellam@example.org',
    role: 'planner',
    organisation: 'Brackwater Process Ltd',
    competence: '',
  },
  {
    key: 'prothero',
    name: 'Dilys Prothero',
    email: 'dilys.prothero@example.org',
    role: 'operations',
    organisation: 'Brackwater Process Ltd, duty operations manager',
    competence: '',
  },
  {
    key: 'mirela',
    name: 'Mirela Stanhope',
    email: 'mirela.stanhope@example.org',
    role: 'auditor',
    organisation: 'Hallam & Rook Inspection Body',
    competence: 'Competent person under the written scheme of examination',
    accessUntil: '2027-03-31',
  },
  {
    key: 'admin',
    name: 'Site administrator',
    email: 'administrator@example.org',
    role: 'administrator',
    organisation: 'Brackwater Process Ltd',
    competence: '',
  },
];
