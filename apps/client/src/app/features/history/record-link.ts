import type { HistoryEntry } from '@ligament/domain/contract/history';

/** Where the record an entry is about can be looked at; null where it has no page of its own. */
export function recordLink({ entity, entityId, componentId }: HistoryEntry): string | null {
  switch (entity) {
    case 'component':
      return `/register/${entityId}`;
    case 'location':
    case 'load case':
    case 'operating cycle':
      return componentId ? `/register/${componentId}` : null;
    case 'inspection':
      return `/inspections/${entityId}`;
    case 'flaw':
      return `/flaws/${entityId}`;
    case 'assessment':
      return `/assessments/${entityId}`;
    case 'person':
      return `/people/${entityId}`;
    case 'site rules':
      return '/site-rules';
    default:
      return null;
  }
}
