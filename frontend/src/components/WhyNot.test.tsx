import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { sessionOf } from '../test/factories';
import { fakeServer, json } from '../test/fakeServer';
import { renderApp } from '../test/renderApp';

describe('what stands in place of a form that can’t be used', () => {
  it.each([
    ['the role', sessionOf('engineer'), /kept by your team’s librarians and admins/, false],
    ['the plan', sessionOf('librarian', 'free'), /no library of its own.*A team admin can see to it/, false],
    ['an unpaid plan', { ...sessionOf('admin'), standing: 'unpaid' as const }, /read-only now/, true],
  ])('says that it is %s, and what to do', async (_, session, words, isAdmin) => {
    fakeServer({ 'GET /api/auth/me': () => json(session) });
    renderApp('/parts/new');
    expect(await screen.findByText(words)).toBeInTheDocument();
    const links = screen.queryAllByRole('link', { name: 'See to the plan' });
    for (const link of links) expect(link).toHaveAttribute('href', '/team/plan');
    expect(links.length > 0).toBe(isAdmin);
  });
});
