import { inject, Injectable } from '@angular/core';
import type { BodyOf } from '@ligament/domain/contract/route';
import { readSiteRules, recordSiteRules } from '@ligament/domain/contract/rules';
import { ApiClient } from '../../core/http/api-client';

/** The site's rules and their versions. */
@Injectable({ providedIn: 'root' })
export class SiteRulesClient {
  private readonly api = inject(ApiClient);

  read() {
    return this.api.call(readSiteRules);
  }

  /** Records a version that replaces the one seen. */
  record(seenNumber: number, body: BodyOf<typeof recordSiteRules>) {
    return this.api.call(recordSiteRules, { version: seenNumber, body });
  }
}
