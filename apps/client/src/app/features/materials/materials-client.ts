import { inject, Injectable } from '@angular/core';
import * as materials from '@ligament/domain/contract/materials';
import type { BodyOf, QueryOf } from '@ligament/domain/contract/route';
import { ApiClient } from '../../core/http/api-client';

/** The materials of the site. */
@Injectable({ providedIn: 'root' })
export class MaterialsClient {
  private readonly api = inject(ApiClient);

  list(query: QueryOf<typeof materials.listMaterials>) {
    return this.api.call(materials.listMaterials, { query });
  }

  read(id: string) {
    return this.api.call(materials.readMaterial, { params: { id } });
  }

  add(body: BodyOf<typeof materials.addMaterial>) {
    return this.api.call(materials.addMaterial, { body });
  }

  change(id: string, version: number, body: BodyOf<typeof materials.changeMaterial>) {
    return this.api.call(materials.changeMaterial, { params: { id }, version, body });
  }
}
