import { documents } from '@ligament/domain/schema/inspections';
import { people } from '@ligament/domain/schema/people';
import { and, asc, eq, ne } from 'drizzle-orm';
import type { Database } from '../../db/database';

const shortColumns = {
  id: documents.id,
  fileName: documents.fileName,
  mediaType: documents.mediaType,
  byteLength: documents.byteLength,
  sha256: documents.sha256,
  createdAt: documents.createdAt,
  uploadedByName: people.name,
};

export const documentRepository = (db: Database) => ({
  async add(values: typeof documents.$inferInsert) {
    const [row] = await db.insert(documents).values(values).returning({ id: documents.id });
    return row;
  },

  /** Attached files in short, without their bytes. */
  of: (entity: string, entityId: string) =>
    db
      .select(shortColumns)
      .from(documents)
      .innerJoin(people, eq(people.id, documents.uploadedBy))
      .where(
        and(
          eq(documents.entity, entity),
          eq(documents.entityId, entityId),
          ne(documents.entity, 'import'),
        ),
      )
      .orderBy(asc(documents.createdAt)),

  async short(id: string) {
    const [row] = await db
      .select(shortColumns)
      .from(documents)
      .innerJoin(people, eq(people.id, documents.uploadedBy))
      .where(eq(documents.id, id));
    return row;
  },

  async byId(siteId: string, id: string) {
    const [row] = await db
      .select()
      .from(documents)
      .where(and(eq(documents.siteId, siteId), eq(documents.id, id)));
    return row;
  },
});
