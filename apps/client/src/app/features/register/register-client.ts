import { inject, Injectable } from '@angular/core';
import * as components from '@ligament/domain/contract/components';
import { listMaterials } from '@ligament/domain/contract/materials';
import type { BodyOf, QueryOf } from '@ligament/domain/contract/route';
import { addUnit, changeUnit, listUnits } from '@ligament/domain/contract/units';
import { map } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';

/** The register: units, components and what belongs to a component. */
@Injectable({ providedIn: 'root' })
export class RegisterClient {
  private readonly api = inject(ApiClient);
  readonly csvAddress = this.api.address(components.exportComponents);

  list(query: QueryOf<typeof components.listComponents>) {
    return this.api.call(components.listComponents, { query });
  }

  read(id: string) {
    return this.api.call(components.readComponent, { params: { id } });
  }

  add(body: BodyOf<typeof components.addComponent>) {
    return this.api.call(components.addComponent, { body });
  }

  change(id: string, version: number, body: BodyOf<typeof components.changeComponent>) {
    return this.api.call(components.changeComponent, { params: { id }, version, body });
  }

  units() {
    return this.api.call(listUnits).pipe(map(({ rows }) => rows));
  }

  addUnit(body: BodyOf<typeof addUnit>) {
    return this.api.call(addUnit, { body });
  }

  changeUnit(id: string, version: number, body: BodyOf<typeof changeUnit>) {
    return this.api.call(changeUnit, { params: { id }, version, body });
  }

  materials() {
    return this.api.call(listMaterials, { query: { limit: 200 } }).pipe(map(({ rows }) => rows));
  }

  removeCycle(id: string, version: number, reason: string) {
    return this.api.call(components.removeOperatingCycle, {
      params: { id },
      version,
      query: { reason },
    });
  }
}
