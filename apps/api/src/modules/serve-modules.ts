import type { Deps } from '../deps';
import type { Api } from '../http/serve';
import { serveAuth } from './auth/auth.routes';
import { serveSiteRules } from './site-rules/site-rules.routes';
import { servePeople } from './people/people.routes';
import { serveHistory } from './history/history.routes';
import { serveHealth } from './health/health.routes';
import { serveComponents } from './components/components.routes';
import { serveGrowthLaws } from './growth-laws/growth-laws.routes';
import { serveMaterials } from './materials/materials.routes';
import { serveSearch } from './search/search.routes';
import { serveUnits } from './units/units.routes';
import { serveAssessments } from './assessments/assessments.routes';
import { serveFlaws } from './flaws/flaws.routes';
import { serveDocuments } from './documents/documents.routes';
import { serveFindings } from './findings/findings.routes';
import { serveImports } from './imports/imports.routes';
import { serveInspections } from './inspections/inspections.routes';
import { serveMails } from './mails/mails.routes';
import { serveReinspections } from './reinspections/reinspections.routes';
import { serveReminders } from './reminders/reminders.routes';
import { serveShutdownWindows } from './shutdown-windows/shutdown-windows.routes';
import { serveToday } from './today/today.routes';

/** Every module's routes, in one list. */
export function serveModules(api: Api, deps: Deps): void {
  serveAuth(api, deps);
  serveSiteRules(api, deps);
  servePeople(api, deps);
  serveHistory(api, deps);
  serveHealth(api, deps);
  serveUnits(api, deps);
  serveMaterials(api, deps);
  serveGrowthLaws(api, deps);
  serveComponents(api, deps);
  serveSearch(api, deps);
  serveFlaws(api, deps);
  serveAssessments(api, deps);
  serveInspections(api, deps);
  serveDocuments(api, deps);
  serveImports(api, deps);
  serveFindings(api, deps);
  serveReinspections(api, deps);
  serveShutdownWindows(api, deps);
  serveReminders(api, deps);
  serveMails(api, deps);
  serveToday(api, deps);
}
