import { inject, Injectable } from '@angular/core';
import {
  previewAssessment,
  readAssessment,
  readAssessmentInputs,
  startAssessment,
} from '@ligament/domain/contract/assessments';
import { readComponent } from '@ligament/domain/contract/components';
import { changeFlaw, listFlaws, readFlaw } from '@ligament/domain/contract/flaws';
import { listGrowthLaws } from '@ligament/domain/contract/growth-laws';
import type { BodyOf, QueryOf } from '@ligament/domain/contract/route';
import { listWindows } from '@ligament/domain/contract/shutdown-windows';
import { listUnits } from '@ligament/domain/contract/units';
import { map } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';

/** Flaws, and what is shown around them. */
@Injectable({ providedIn: 'root' })
export class FlawsClient {
  private readonly api = inject(ApiClient);

  list(query: QueryOf<typeof listFlaws>) {
    return this.api.call(listFlaws, { query });
  }

  read(id: string) {
    return this.api.call(readFlaw, { params: { id } });
  }

  change(id: string, version: number, body: BodyOf<typeof changeFlaw>) {
    return this.api.call(changeFlaw, { params: { id }, version, body });
  }

  assessment(id: string) {
    return this.api.call(readAssessment, { params: { id } });
  }

  inputs(flawId: string) {
    return this.api.call(readAssessmentInputs, { params: { id: flawId }, query: {} });
  }

  preview(body: BodyOf<typeof previewAssessment>) {
    return this.api.call(previewAssessment, { body });
  }

  start(flawId: string, body: BodyOf<typeof startAssessment>) {
    return this.api.call(startAssessment, { params: { id: flawId }, body });
  }

  units() {
    return this.api.call(listUnits).pipe(map(({ rows }) => rows));
  }

  loadCases(componentId: string) {
    return this.api
      .call(readComponent, { params: { id: componentId } })
      .pipe(map(({ loadCases }) => loadCases));
  }

  growthLaws() {
    return this.api.call(listGrowthLaws).pipe(map(({ rows }) => rows));
  }

  windows() {
    return this.api.call(listWindows).pipe(map(({ rows }) => rows));
  }
}
