import { inject, Injectable } from '@angular/core';
import * as reinspections from '@ligament/domain/contract/reinspections';
import * as reminders from '@ligament/domain/contract/reminders';
import type { BodyOf, QueryOf } from '@ligament/domain/contract/route';
import * as windows from '@ligament/domain/contract/shutdown-windows';
import { listUnits } from '@ligament/domain/contract/units';
import { map } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';

/** Re-inspections, shutdown windows and reminders. */
@Injectable({ providedIn: 'root' })
export class ScheduleClient {
  private readonly api = inject(ApiClient);

  list(query: QueryOf<typeof reinspections.listReinspections>) {
    return this.api.call(reinspections.listReinspections, { query });
  }

  read(id: string) {
    return this.api.call(reinspections.readReinspection, { params: { id } });
  }

  plan(id: string, version: number, body: BodyOf<typeof reinspections.planReinspection>) {
    return this.api.call(reinspections.planReinspection, { params: { id }, version, body });
  }

  unplan(id: string, version: number, reason: string) {
    return this.api.call(reinspections.unplanReinspection, {
      params: { id },
      version,
      body: { reason },
    });
  }

  windows() {
    return this.api.call(windows.listWindows).pipe(map(({ rows }) => rows));
  }

  window(id: string) {
    return this.api.call(windows.readWindow, { params: { id } });
  }

  addWindow(body: BodyOf<typeof windows.addWindow>) {
    return this.api.call(windows.addWindow, { body });
  }

  changeWindow(id: string, version: number, body: BodyOf<typeof windows.changeWindow>) {
    return this.api.call(windows.changeWindow, { params: { id }, version, body });
  }

  units() {
    return this.api.call(listUnits).pipe(map(({ rows }) => rows));
  }

  reminders(query: QueryOf<typeof reminders.listReminders>) {
    return this.api.call(reminders.listReminders, { query });
  }

  acknowledge(id: string) {
    return this.api.call(reminders.acknowledgeReminder, { params: { id }, body: {} });
  }

  runReminders() {
    return this.api.call(reminders.runReminders, { body: {} });
  }

  heartbeat() {
    return this.api.call(reminders.readHeartbeat);
  }
}
