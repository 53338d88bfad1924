import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { OpenInvitation } from '../../api/invitation';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const OPEN: OpenInvitation = {
  team: { id: '1', name: 'Tarnfield Instruments' },
  email: 'nell@weir.example',
  roles: ['engineer', 'reviewer'],
  invitedBy: 'Ada Merrow',
  expiresAt: '2199-12-07T10:00:00.000Z',
  hasAccount: false,
};
const NOBODY = { 'GET /api/auth/me': () => problem(401, 'session.missing') };
const opened = (changes: Partial<OpenInvitation> = {}) => ({
  'GET /api/invitations/t0ken': () => json({ ...OPEN, ...changes }),
});

describe('the page of an invitation', () => {
  it('makes an account, joins the team with it and signs it in', async () => {
    const asked = fakeServer({
      ...NOBODY,
      ...opened(),
      'POST /api/invitations/t0ken/account': () => json({ id: '1', name: 'Tarnfield Instruments' }, 201),
      'POST /api/auth/sign-in': () => json(sessionOf('engineer')),
    });
    renderApp('/invitations/t0ken');
    expect(await screen.findByText(/Ada Merrow invites/)).toHaveTextContent('as engineer, reviewer');
    await userEvent.type(await screen.findByLabelText('Your name'), 'Nell Weir');
    await userEvent.type(screen.getByLabelText('Password'), 'too short{Enter}');
    expect(await screen.findByText('At least 12 characters are needed.')).toBeInTheDocument();
    await userEvent.type(screen.getByLabelText('Password'), ' no longer{Enter}');
    expect(await screen.findByRole('navigation', { name: 'Pages' })).toBeInTheDocument();
    const sent = asked.filter(({ route }) => route.startsWith('POST')).map(({ body }) => body);
    expect(sent.slice(0, 2)).toEqual([
      { name: 'Nell Weir', password: 'too short no longer' },
      { email: 'nell@weir.example', password: 'too short no longer' },
    ]);
  });

  it('leads an address that has an account to the sign-in, and back', async () => {
    fakeServer({ ...NOBODY, ...opened({ hasAccount: true }) });
    renderApp('/invitations/t0ken');
    expect(await screen.findByRole('link', { name: 'sign in with it' })).toHaveAttribute(
      'href',
      '/sign-in?next=/invitations/t0ken',
    );
  });

  it('joins with the account that is signed in, but not with that of another address', async () => {
    const asked = fakeServer({
      'GET /api/auth/me': () => json(sessionOf('engineer')),
      ...opened({ email: 'engineer@tarnfield.example' }),
      'POST /api/invitations/t0ken/accept': () => json({ id: '1', name: 'Tarnfield Instruments' }),
      'POST /api/auth/team': () => json(sessionOf('engineer')),
    });
    renderApp('/invitations/t0ken');
    await userEvent.click(await screen.findByRole('button', { name: 'Join Tarnfield Instruments' }));
    expect(await screen.findByRole('navigation', { name: 'Pages' })).toBeInTheDocument();
    const sent = asked
      .filter(({ route }) => route.startsWith('POST'))
      .map(({ route, body }) => [route, body]);
    expect(sent.slice(0, 2)).toEqual([
      ['POST /api/invitations/t0ken/accept', null],
      ['POST /api/auth/team', { teamId: '1' }],
    ]);
  });

  it('tells somebody else who is signed in to sign out', async () => {
    fakeServer({ 'GET /api/auth/me': () => json(sessionOf('engineer')), ...opened() });
    renderApp('/invitations/t0ken');
    expect(await screen.findByText(/invitation is for another address/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /^Join/ })).toBeNull();
  });

  it('says what is wrong with a link that is used up', async () => {
    const detail = 'This invitation has been accepted already: sign in.';
    fakeServer({
      ...NOBODY,
      'GET /api/invitations/t0ken': () => problem(409, 'invitation.used', { detail }),
    });
    renderApp('/invitations/t0ken');
    expect(await screen.findByRole('alert')).toHaveTextContent(detail);
  });
});
