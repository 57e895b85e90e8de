import type { Role } from '@ligament/domain/contract/policy';
import type { SessionView } from '@ligament/domain/contract/session';

/** A session of a person with a role on the invented plant, for specs. */
export const sessionOf = (role: Role, demo = false): SessionView => ({
  user: {
    id: '5e0d8c52-7f0f-4b59-9f0b-0d6a3c2f1a01',
    name: 'Ada Quill',
    email: 'ada.quill@saltmere.example',
    role,
    organisation: 'Brackwater Process Ltd',
  },
  site: {
    id: '5e0d8c52-7f0f-4b59-9f0b-0d6a3c2f1a02',
    code: 'SAL',
    name: 'Saltmere Works',
    timeZone: 'Europe/London',
    demo,
  },
  expiresAt: '2026-12-01T20:00:00.000Z',
});
