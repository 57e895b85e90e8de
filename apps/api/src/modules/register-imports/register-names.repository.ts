import { components } from '@ligament/domain/schema/components';
import { materials } from '@ligament/domain/schema/materials';
import { units } from '@ligament/domain/schema/sites';
import { eq } from 'drizzle-orm';
import type { Database } from '../../db/database';
import { plainTag, type RegisterNames } from './read-register';

/** Names that a register table of a site may refer to. */
export async function registerNames(db: Database, siteId: string): Promise<RegisterNames> {
  const unitRows = await db
    .select({ code: units.code, id: units.id })
    .from(units)
    .where(eq(units.siteId, siteId));
  const materialRows = await db
    .select({ name: materials.name, id: materials.id })
    .from(materials)
    .where(eq(materials.siteId, siteId));
  const tagRows = await db
    .select({ tag: components.tag })
    .from(components)
    .where(eq(components.siteId, siteId));
  return {
    units: new Map(unitRows.map(({ code, id }) => [code, id])),
    materials: new Map(materialRows.map(({ name, id }) => [name, id])),
    tags: new Set(tagRows.map(({ tag }) => plainTag(tag))),
  };
}
