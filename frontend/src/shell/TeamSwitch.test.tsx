import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { ACCOUNT } from '../test/account';
import { sessionOf } from '../test/factories';
import { fakeServer, json } from '../test/fakeServer';
import { renderApp } from '../test/renderApp';

describe('the team’s name on the rail', () => {
  it('leads a member of several teams into another', async () => {
    const session = sessionOf('engineer');
    const teams = [session.team, { id: '2', name: 'Weir & Daughter' }];
    const asked = fakeServer({
      ...ACCOUNT,
      'GET /api/auth/me': () => json({ ...session, teams }),
      'POST /api/auth/team': () => json({ ...session, team: teams[1], teams }),
    });
    renderApp('/account');
    await userEvent.click(await screen.findByRole('button', { name: /Team: Tarnfield Instruments/ }));
    await userEvent.click(await screen.findByRole('menuitem', { name: 'Weir & Daughter' }));
    await waitFor(() =>
      expect(asked).toContainEqual(
        expect.objectContaining({ route: 'POST /api/auth/team', body: { teamId: '2' } }),
      ),
    );
  });

  it('is but a name for a member of one', async () => {
    fakeServer({ ...ACCOUNT, 'GET /api/auth/me': () => json(sessionOf('engineer')) });
    renderApp('/account');
    await screen.findByRole('navigation', { name: 'Pages' });
    expect(screen.queryByRole('button', { name: /Tarnfield Instruments/ })).toBeNull();
  });
});
