import type { loadCases, locations, operatingCycles } from '@ligament/domain/schema/components';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { notFound, staleVersion, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { writeHistory } from '../history/write-history';
import { componentPartRepository } from './component-part.repository';
import { componentRepository } from './component.repository';

type PartTable = typeof locations | typeof loadCases | typeof operatingCycles;

/** A kind of record below a component: where it is kept, its word, and the constraint that keeps its names apart. */
interface Part<T extends PartTable> {
  readonly table: T;
  readonly word: 'location' | 'load case' | 'operating cycle';
  readonly unique: string;
}

const actionOf = (word: string, verb: string) => `${word.replace(' ', '-')}.${verb}`;

/** Adds a part to a component of the site. */
export function addPart<T extends PartTable>(
  { db, clock }: Deps,
  actor: Actor,
  { table, word, unique }: Part<T>,
  componentId: string,
  input: Omit<T['$inferInsert'], 'componentId' | 'createdAt' | 'updatedAt'> & {
    readonly name: string;
  },
): Promise<T['$inferSelect']> {
  return refuseRepeat(unique, 'name', `This component already has a ${word} “${input.name}”.`, () =>
    db.transaction(async (tx) => {
      const owner = await componentRepository(tx).byId(actor.siteId, componentId);
      if (!owner) throw notFound('component');
      await refuseForeignLoadCase(componentRepository(tx), componentId, input);
      const now = clock.now();
      const values = { ...input, componentId, createdAt: now, updatedAt: now } as T['$inferInsert'];
      const added = await componentPartRepository(tx, table).add(values);
      if (!added) throw notFound(word);
      await writeHistory(tx, actor, now, {
        action: actionOf(word, 'added'),
        entity: word,
        entityId: added.id,
        componentId,
        summary: `${owner.component.tag}: ${word} ${added.name} added`,
        after: added,
      });
      return added;
    }),
  );
}

/** Changes a part, with a reason. */
export function changePart<T extends PartTable>(
  { db, clock }: Deps,
  actor: Actor,
  { table, word, unique }: Part<T>,
  id: string,
  seen: number,
  change: Partial<T['$inferInsert']> & { readonly name?: string | undefined },
  reason: string,
): Promise<T['$inferSelect']> {
  return refuseRepeat(
    unique,
    'name',
    `This component already has a ${word} “${change.name}”.`,
    () =>
      db.transaction(async (tx) => {
        const repository = componentPartRepository(tx, table);
        const before = await repository.byId(actor.siteId, id);
        if (!before) throw notFound(word);
        await refuseForeignLoadCase(componentRepository(tx), before.component.id, change);
        const now = clock.now();
        const after = await repository.change(id, seen, { ...change, updatedAt: now } as Partial<
          T['$inferInsert']
        >);
        if (!after) throw staleVersion(word, before.part);
        await writeHistory(tx, actor, now, {
          action: actionOf(word, 'changed'),
          entity: word,
          entityId: id,
          componentId: before.component.id,
          summary: `${before.component.tag}: ${word} ${after.name} changed`,
          before: before.part,
          after,
          reason,
        });
        return after;
      }),
  );
}

/** Takes a part away, with a reason; the history keeps what it was. */
export function removePart<T extends PartTable>(
  { db, clock }: Deps,
  actor: Actor,
  { table, word }: Part<T>,
  id: string,
  seen: number,
  reason: string,
): Promise<void> {
  return db.transaction(async (tx) => {
    const repository = componentPartRepository(tx, table);
    const before = await repository.byId(actor.siteId, id);
    if (!before) throw notFound(word);
    if (!(await repository.remove(id, seen))) throw staleVersion(word, before.part);
    await writeHistory(tx, actor, clock.now(), {
      action: actionOf(word, 'removed'),
      entity: word,
      entityId: id,
      componentId: before.component.id,
      summary: `${before.component.tag}: ${word} ${before.part.name} removed`,
      before: before.part,
      reason,
    });
  });
}

/** An operating cycle scales a load case of its own component. */
async function refuseForeignLoadCase(
  repository: ReturnType<typeof componentRepository>,
  componentId: string,
  input: object,
): Promise<void> {
  if (!('loadCaseId' in input) || input.loadCaseId === undefined) return;
  const own = await repository.loadCases(componentId);
  if (!own.some(({ id }) => id === input.loadCaseId)) {
    throw unacceptable(
      'operating-cycle.load-case',
      'Choose a load case of this component.',
      'loadCaseId',
    );
  }
}
