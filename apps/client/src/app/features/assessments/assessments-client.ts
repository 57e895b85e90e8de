import { inject, Injectable } from '@angular/core';
import {
  approveAssessment,
  changeAssessment,
  readAssessment,
  readAssessmentInputs,
  recomputeAssessment,
  returnAssessment,
  submitAssessment,
} from '@ligament/domain/contract/assessments';
import { readFlaw } from '@ligament/domain/contract/flaws';
import { listGrowthLaws } from '@ligament/domain/contract/growth-laws';
import type { BodyOf } from '@ligament/domain/contract/route';
import { readSiteRules } from '@ligament/domain/contract/rules';
import { listWindows } from '@ligament/domain/contract/shutdown-windows';
import { map } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';

/** Assessments, and what they start from. */
@Injectable({ providedIn: 'root' })
export class AssessmentsClient {
  private readonly api = inject(ApiClient);

  read(id: string) {
    return this.api.call(readAssessment, { params: { id } });
  }

  change(id: string, version: number, body: BodyOf<typeof changeAssessment>) {
    return this.api.call(changeAssessment, { params: { id }, version, body });
  }

  submit(id: string, version: number) {
    return this.api.call(submitAssessment, { params: { id }, version });
  }

  giveBack(id: string, version: number, reason: string) {
    return this.api.call(returnAssessment, { params: { id }, version, body: { reason } });
  }

  approve(id: string, version: number, comment: string) {
    return this.api.call(approveAssessment, { params: { id }, version, body: { comment } });
  }

  recompute(id: string) {
    return this.api.call(recomputeAssessment, { params: { id } });
  }

  /** What the register says now about the inputs of a flaw's assessment. */
  register(flawId: string, findingId: string) {
    return this.api
      .call(readAssessmentInputs, { params: { id: flawId }, query: { findingId } })
      .pipe(map(({ input }) => input));
  }

  flaw(id: string) {
    return this.api.call(readFlaw, { params: { id } });
  }

  rules() {
    return this.api.call(readSiteRules).pipe(map(({ current }) => current.rules));
  }

  growthLaws() {
    return this.api.call(listGrowthLaws).pipe(map(({ rows }) => rows));
  }

  windows() {
    return this.api.call(listWindows).pipe(map(({ rows }) => rows));
  }
}
