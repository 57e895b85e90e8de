// The one list of tables the database driver is given.
import { assessments, signatures } from './assessments';
import { components, loadCases, locations, operatingCycles } from './components';
import { findings, flaws } from './flaws';
import { history } from './history';
import { documents, imports, inspections } from './inspections';
import { growthLaws, materials } from './materials';
import { idempotencyKeys, oneTimeTokens, people, sessions, throttles } from './people';
import {
  outgoingMails,
  receivedMails,
  reinspections,
  reminders,
  shutdownWindowUnits,
  shutdownWindows,
} from './schedule';
import { siteRuleVersions, sites, units } from './sites';

export const tables = {
  sites,
  siteRuleVersions,
  units,
  materials,
  growthLaws,
  components,
  locations,
  loadCases,
  operatingCycles,
  people,
  sessions,
  oneTimeTokens,
  throttles,
  idempotencyKeys,
  inspections,
  documents,
  imports,
  flaws,
  findings,
  assessments,
  signatures,
  shutdownWindows,
  shutdownWindowUnits,
  reinspections,
  reminders,
  outgoingMails,
  receivedMails,
  history,
};
