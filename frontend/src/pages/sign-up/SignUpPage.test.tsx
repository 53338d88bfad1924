import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const NOBODY = { 'GET /api/auth/me': () => problem(401, 'session.missing') };
const nothing = () => new Response(null, { status: 204 });

describe('signing up', () => {
  it('names every fault at its field at once, before anything is sent', async () => {
    const asked = fakeServer(NOBODY);
    renderApp('/sign-up');
    await userEvent.type(await screen.findByLabelText('E-mail'), 'nell');
    await userEvent.type(screen.getByLabelText('Password'), 'short{Enter}');
    for (const fault of [
      'Your name is needed',
      'An address such as name@company.example is needed.',
      'At least 12 characters are needed.',
      'A name for your team is needed',
    ])
      expect(await screen.findByText(fault)).toBeInTheDocument();
    expect(asked.filter(({ route }) => route.startsWith('POST'))).toEqual([]);
  });

  it('shows a refusal at its field, then where to go on, and sends the e-mail again', async () => {
    const message = 'This is one of the passwords that everybody tries first.';
    let answer = () => problem(400, 'request.invalid', { errors: [{ field: 'password', message }] });
    const asked = fakeServer({ ...NOBODY, 'POST /api/auth/sign-up': () => answer() });
    renderApp('/sign-up');
    await userEvent.type(await screen.findByLabelText('Your name'), 'Nell Weir');
    await userEvent.type(screen.getByLabelText('E-mail'), 'nell@weir.example');
    await userEvent.type(screen.getByLabelText('Password'), 'leavemealone');
    await userEvent.type(screen.getByLabelText('Your team’s name'), 'Weir{Enter}');
    expect(await screen.findByText(message)).toBeInTheDocument();
    answer = nothing;
    await userEvent.type(screen.getByLabelText('Password'), ' please{Enter}');
    expect(await screen.findByRole('heading', { name: 'Check your mail' })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Send it again' }));
    expect(await screen.findByText('It has been sent again.')).toBeInTheDocument();
    expect(asked.at(-1)?.body).toEqual({
      name: 'Nell Weir',
      email: 'nell@weir.example',
      password: 'leavemealone please',
      teamName: 'Weir',
    });
  });
});

describe('a link in an e-mail', () => {
  it('confirms an address only when it is told to', async () => {
    const asked = fakeServer({
      ...NOBODY,
      'GET /api/auth/links/t0ken': () => json({ purpose: 'sign-up', email: 'nell@weir.example' }),
      'POST /api/auth/confirm': nothing,
    });
    renderApp('/confirm/t0ken');
    const button = await screen.findByRole('button', { name: 'Confirm the address' });
    expect(asked.some(({ route }) => route.startsWith('POST'))).toBe(false);
    await userEvent.click(button);
    expect(await screen.findByText(/The address is confirmed/)).toBeInTheDocument();
  });

  it.each(['/confirm/t0ken', '/reset-password/t0ken'])('says at %s that it is used up', async (address) => {
    const detail = 'This link has been used.';
    fakeServer({ ...NOBODY, 'GET /api/auth/links/t0ken': () => problem(410, 'token.used', { detail }) });
    renderApp(address);
    expect(await screen.findByRole('alert')).toHaveTextContent(detail);
  });
});
