import type { Actor } from '../../http/actor';
import { conflict, forbidden } from '../../http/failure';
import type { AssessmentRecord } from './assessment.repository';

/** Four eyes: nobody who wrote or changed an assessment decides on it, and only a submitted one is decided on. */
export function refuseOwnWork(actor: Actor, record: AssessmentRecord): void {
  if (record.authorId === actor.personId || record.editorIds.includes(actor.personId)) {
    throw forbidden('You worked on this assessment yourself; somebody else has to check it.');
  }
  if (record.state !== 'submitted') {
    throw conflict(
      'assessment.not-submitted',
      `This assessment is ${record.state}; only a submitted one is checked.`,
    );
  }
}
