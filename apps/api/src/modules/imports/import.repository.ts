import type {
  ImportAnswersBody,
  ImportColumn,
  ImportDecision,
  ImportReading,
} from '@ligament/domain/contract/imports';
import { components } from '@ligament/domain/schema/components';
import { documents, imports, inspections } from '@ligament/domain/schema/inspections';
import { people } from '@ligament/domain/schema/people';
import { and, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

export interface Correction {
  readonly row: number;
  readonly column: number;
  readonly value: string;
  readonly from: string;
  readonly reason: string;
  readonly by: string;
}

/** An import with the members whose shape the contract knows. */
export interface ImportRecord extends Omit<
  typeof imports.$inferSelect,
  'reading' | 'mapping' | 'corrections' | 'decisions'
> {
  readonly reading: ImportReading & { readonly answers: ImportAnswersBody };
  readonly mapping: readonly ImportColumn[];
  readonly corrections: readonly Correction[];
  readonly decisions: readonly ImportDecision[];
}

export const importRepository = (db: Database) => ({
  async byId(siteId: string, id: string) {
    const [row] = await db
      .select({
        record: imports,
        inspection: inspections,
        component: components,
        fileName: documents.fileName,
        bytes: documents.bytes,
      })
      .from(imports)
      .innerJoin(inspections, eq(inspections.id, imports.inspectionId))
      .innerJoin(components, eq(components.id, inspections.componentId))
      .innerJoin(documents, eq(documents.id, imports.documentId))
      .where(and(eq(imports.siteId, siteId), eq(imports.id, id)));
    return row && { ...row, record: row.record as ImportRecord };
  },

  /** The import that already made findings of the same file. */
  async committedWith(siteId: string, sha256: string) {
    const [row] = await db
      .select({
        committedAt: imports.committedAt,
        by: people.name,
        reportNo: inspections.reportNo,
        tag: components.tag,
      })
      .from(imports)
      .innerJoin(inspections, eq(inspections.id, imports.inspectionId))
      .innerJoin(components, eq(components.id, inspections.componentId))
      .leftJoin(people, eq(people.id, imports.committedBy))
      .where(
        and(eq(imports.siteId, siteId), eq(imports.sha256, sha256), eq(imports.state, 'committed')),
      );
    return row;
  },

  async add(values: typeof imports.$inferInsert): Promise<{ readonly id: string } | undefined> {
    const [row] = await db.insert(imports).values(values).returning({ id: imports.id });
    return row;
  },

  /** Changes a preview at the version seen. */
  async change(
    id: string,
    seen: number,
    values: Partial<typeof imports.$inferInsert>,
  ): Promise<boolean> {
    const rows = await db
      .update(imports)
      .set({ ...values, version: sql`${imports.version} + 1` })
      .where(and(eq(imports.id, id), eq(imports.version, seen), eq(imports.state, 'preview')))
      .returning({ id: imports.id });
    return rows.length === 1;
  },
});
