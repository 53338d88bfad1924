import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { sessionOf } from '../../test/factories';
import { ACCOUNT } from '../../test/account';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const NOBODY = { 'GET /api/auth/me': () => problem(401, 'session.missing') };

async function signIn() {
  await userEvent.type(await screen.findByLabelText('E-mail'), 'librarian@tarnfield.example');
  await userEvent.type(screen.getByLabelText('Password'), 'quiet-bench-2026{Enter}');
}

describe('signing in', () => {
  it('is asked of who opens a page without a session, and leads to that page', async () => {
    const asked = fakeServer({
      ...ACCOUNT,
      ...NOBODY,
      'POST /api/auth/sign-in': () => json(sessionOf('librarian')),
    });
    const router = renderApp('/account?from=mail');
    await signIn();
    expect(await screen.findByRole('heading', { name: 'Ada Merrow' })).toBeInTheDocument();
    expect(router.state.location).toMatchObject({ pathname: '/account', search: '?from=mail' });
    expect(asked.find(({ route }) => route === 'POST /api/auth/sign-in')?.body).toEqual({
      email: 'librarian@tarnfield.example',
      password: 'quiet-bench-2026',
    });
  });

  it('never leads to another site', async () => {
    fakeServer({ 'GET /api/auth/me': () => json(sessionOf('librarian')) });
    const router = renderApp('/sign-in?next=//evil.example/account');
    await waitFor(() => expect(router.state.location.pathname).toBe('/rank'));
  });

  it('says alike for a wrong e-mail and a wrong password that they don’t match', async () => {
    fakeServer({ ...NOBODY, 'POST /api/auth/sign-in': () => problem(401, 'session.wrong-credentials') });
    renderApp('/sign-in');
    await signIn();
    expect(await screen.findByRole('alert')).toHaveTextContent('E-mail and password don’t match an account');
    expect(screen.getByLabelText('E-mail')).toHaveValue('librarian@tarnfield.example');
  });

  it('says how many seconds to wait after too many attempts', async () => {
    const slow = () => problem(429, 'request.too-many', {}, { 'Retry-After': '40' });
    fakeServer({ ...NOBODY, 'POST /api/auth/sign-in': slow });
    renderApp('/sign-in');
    await signIn();
    expect(await screen.findByRole('alert')).toHaveTextContent(/Try again in \d+ seconds/);
    expect(screen.getByRole('button', { name: 'Sign in' })).toBeDisabled();
  });

  it('needs both fields', async () => {
    const asked = fakeServer(NOBODY);
    renderApp('/sign-in');
    await userEvent.click(await screen.findByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText('Your e-mail address is needed')).toBeInTheDocument();
    expect(screen.getByText('Your password is needed')).toBeInTheDocument();
    expect(asked.map(({ route }) => route)).toEqual(['GET /api/auth/me']);
  });
});

describe('the shell', () => {
  it('says that the server is away and shows the page when it is back', async () => {
    let isAway = true;
    fakeServer({
      ...ACCOUNT,
      'GET /api/auth/me': () => (isAway ? problem(503, 'database.unavailable') : json(sessionOf('reviewer'))),
    });
    renderApp('/account');
    expect(await screen.findByText(/can’t be reached; it tries again by itself/)).toBeInTheDocument();
    isAway = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try now' }));
    expect(await screen.findByRole('heading', { name: 'Ada Merrow' })).toBeInTheDocument();
    expect(screen.queryByText(/can’t be reached/)).not.toBeInTheDocument();
  });

  it('has a page for an address that means nothing', async () => {
    fakeServer({ 'GET /api/auth/me': () => json(sessionOf('reviewer')) });
    renderApp('/nothing-here');
    expect(await screen.findByRole('heading', { name: 'There is no such page' })).toBeInTheDocument();
  });

  it('keeps the chosen theme', async () => {
    fakeServer({ ...ACCOUNT, 'GET /api/auth/me': () => json(sessionOf('reviewer')) });
    renderApp('/account');
    await userEvent.click(await screen.findByRole('radio', { name: 'Dark' }));
    expect(document.documentElement).toHaveAttribute('data-theme', 'dark');
    expect(document.documentElement.style.getPropertyValue('--damson')).toBe('#C58AB5');
    expect(localStorage.getItem('roothertz.theme')).toBe('dark');
  });
});
