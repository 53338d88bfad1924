import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { ACCOUNT, openSession } from '../../test/account';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const SIGNED_IN = { ...ACCOUNT, 'GET /api/auth/me': () => json(sessionOf('engineer')) };
const nothing = () => new Response(null, { status: 204 });
const refused = (field: string, message: string) =>
  problem(422, 'account.invalid', { errors: [{ field, message }] });

describe('the account page', () => {
  it('changes the password, and says at the field what is wrong', async () => {
    let answer = () => refused('currentPassword', 'This is not your password.');
    const asked = fakeServer({ ...SIGNED_IN, 'POST /api/account/password': () => answer() });
    renderApp('/account');
    await userEvent.click(await screen.findByRole('button', { name: 'Change: Password' }));
    expect(screen.getByLabelText('Current password')).toHaveFocus();
    await userEvent.type(screen.getByLabelText('Current password'), 'a guess');
    await userEvent.type(screen.getByLabelText('New password'), 'too short{Enter}');
    expect(await screen.findByText('At least 12 characters are needed.')).toBeInTheDocument();
    await userEvent.type(screen.getByLabelText('New password'), ' no more{Enter}');
    expect(await screen.findByText('This is not your password.')).toBeInTheDocument();
    answer = nothing;
    await userEvent.click(screen.getByRole('button', { name: 'Change the password' }));
    expect(await screen.findByText(/your other sessions are over/)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Change: Password' })).toHaveFocus();
    const [sent, then] = asked.slice(-2);
    expect(sent.body).toEqual({ currentPassword: 'a guess', newPassword: 'too short no more' });
    expect(then.route).toBe('GET /api/auth/sessions');
  });

  it('ends another session', async () => {
    const sessions = [openSession(), openSession({ id: '12', current: false, userAgent: 'curl/8.5.0' })];
    fakeServer({
      ...SIGNED_IN,
      'GET /api/auth/sessions': () => json({ items: sessions }),
      'DELETE /api/auth/sessions/12': () => {
        sessions.pop();
        return nothing();
      },
    });
    renderApp('/account');
    const list = within(await screen.findByRole('list', { name: 'Open sessions' }));
    expect(list.getByText(/Chrome on Linux/)).toBeInTheDocument();
    await userEvent.click(list.getByRole('button', { name: /End the session of curl/ }));
    await expect.poll(() => list.queryByText(/curl/)).toBeNull();
    expect(screen.queryByRole('button', { name: 'End all others' })).toBeNull();
    expect(screen.getByRole('list', { name: 'Open sessions' })).toHaveFocus();
  });

  it('says what closing the account means, and doesn’t offer it to the last admin', async () => {
    const departure = { team: { id: '1', name: 'Tarnfield' }, closes: false };
    fakeServer({
      ...SIGNED_IN,
      'GET /api/account/closing': () =>
        json({ items: [{ ...departure, obstacle: 'A team needs an admin.' }] }),
    });
    renderApp('/account');
    await userEvent.click(await screen.findByRole('button', { name: 'Close the account…' }));
    expect(await screen.findByText('Tarnfield: A team needs an admin.')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Close it for good' })).toBeNull();
  });

  it('keeps what is being written when the session ends, and goes on after signing in again', async () => {
    let isOver = true;
    fakeServer({
      ...SIGNED_IN,
      'PATCH /api/account': () => (isOver ? problem(401, 'session.missing') : nothing()),
      'POST /api/auth/sign-in': () => json(sessionOf('engineer')),
    });
    renderApp('/account');
    await userEvent.click(await screen.findByRole('button', { name: 'Change: Name' }));
    await userEvent.type(screen.getByLabelText('Your name'), ' the Second{Enter}');
    const dialog = within(await screen.findByRole('dialog', { name: 'Your session is over' }));
    expect(dialog.getByLabelText('E-mail')).toHaveValue('engineer@tarnfield.example');
    isOver = false;
    await userEvent.type(dialog.getByLabelText('Password'), 'quiet-bench-2026{Enter}');
    await expect.poll(() => screen.queryByRole('dialog')).toBeNull();
    expect(screen.getByLabelText('Your name')).toHaveValue('Ada Merrow the Second');
    expect(screen.getByLabelText('Your name')).toHaveFocus();
    await userEvent.click(screen.getByRole('button', { name: 'Save the name' }));
    expect(await screen.findByText('Saved.')).toBeInTheDocument();
  });
});
