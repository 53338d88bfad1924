import type { OpenSession } from '../api/account';
import { json } from './fakeServer';

const CHROME = 'Mozilla/5.0 (X11; Linux x86_64) AppleWebKit/537.36 Chrome/140.0 Safari/537.36';

export function openSession(changes: Partial<OpenSession> = {}): OpenSession {
  return {
    id: '11',
    team: { id: '1', name: 'Tarnfield Instruments' },
    createdAt: '2026-12-01T08:00:00.000Z',
    lastSeenAt: '2026-12-01T09:30:00.000Z',
    userAgent: CHROME,
    address: '192.0.2.7',
    current: true,
    ...changes,
  };
}

/** What the account page asks for. */
export const ACCOUNT = {
  'GET /api/auth/sessions': () => json({ items: [openSession()] }),
  'GET /api/auth/teams': () =>
    json({ items: [{ id: '1', name: 'Tarnfield Instruments', roles: ['engineer'] }] }),
  'GET /api/mail/preferences': () =>
    json({ items: [{ kind: 'price-digest', label: 'Weekly list of prices', wanted: true }] }),
};
