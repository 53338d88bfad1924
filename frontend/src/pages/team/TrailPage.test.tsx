import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { AuditEntry } from '../../api/audit';
import { sessionOf } from '../../test/factories';
import { fakeServer, json } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';
import { MEMBERS } from '../../test/team';

const CHANGED = {
  id: '12',
  at: '2026-12-01T09:41:00.000Z',
  by: { id: '8', name: 'Tobias Fenn' },
  action: 'part.changed',
  object: { kind: 'op-amp', id: '41', label: 'Vireo VR-1108' },
  from: { package: 'SOIC-8', amplifier: { channels: 1 } },
  to: { package: 'SOIC-8', amplifier: { channels: 2 } },
} as unknown as AuditEntry;

function showTrail(address: string, items: AuditEntry[]) {
  const asked = fakeServer({
    'GET /api/auth/me': () => json(sessionOf('admin')),
    'GET /api/team/members': () => json({ items: MEMBERS, total: MEMBERS.length }),
    'GET /api/audit': () => json({ items, total: items.length }),
  });
  const router = renderApp(address);
  const queries = () => asked.filter(({ route }) => route === 'GET /api/audit').map(({ url }) => url.search);
  return { router, queries };
}

describe('the audit trail', () => {
  it('tells in words who did what, from what to what, with a link to it', async () => {
    showTrail('/team/trail', [CHANGED, { ...CHANGED, id: '13', by: null, action: 'part.deleted', to: null }]);
    const [, changed, deleted] = await screen.findAllByRole('row');
    expect(changed).toHaveTextContent('Tobias Fenn changed the part Vireo VR-1108');
    expect(changed).toHaveTextContent('amplifier channels 1 → 2');
    expect(within(changed).getByRole('link')).toHaveAttribute('href', '/parts/41');
    expect(deleted).toHaveTextContent('a former member deleted the part Vireo VR-1108');
    expect(within(deleted).queryByRole('link')).toBeNull();
  });

  it('is narrowed by its address, and exported as it is narrowed', async () => {
    const { router, queries } = showTrail('/team/trail?member=8&from=2026-12-01&kind=nonsense', [CHANGED]);
    await screen.findByRole('table');
    expect(queries()[0]).toBe('?userId=8&from=2026-12-01&limit=50&offset=0');
    expect(screen.getByRole('link', { name: 'Export as CSV' })).toHaveAttribute(
      'href',
      '/api/audit/export.csv?userId=8&from=2026-12-01',
    );
    await userEvent.click(screen.getByLabelText('Action'));
    await userEvent.click(await screen.findByTitle('changed the part'));
    expect(router.state.location.search).toBe('?action=part.changed&member=8&from=2026-12-01');
    expect(queries().at(-1)).toContain('action=part.changed');
  });

  it('says so where nothing of it was done', async () => {
    const { router } = showTrail('/team/trail?to=2020-01-01', []);
    await userEvent.click(await screen.findByRole('button', { name: 'Show all of it' }));
    expect(router.state.location.search).toBe('');
    expect(await screen.findByText('Nothing has been changed yet.')).toBeInTheDocument();
  });
});
