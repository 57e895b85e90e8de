import type { MaterialView } from '@ligament/domain/contract/materials';
import type { MaterialRow } from './material.repository';

/** A material as it leaves the server. */
export const materialView = (material: MaterialRow, components: number): MaterialView => ({
  ...material,
  origins: material.origins as MaterialView['origins'],
  updatedAt: material.updatedAt.toISOString(),
  components,
});
