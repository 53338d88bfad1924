import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';
import { INVITATION, MEMBERS } from '../../test/team';

const LISTS = {
  'GET /api/team/members': () => json({ items: MEMBERS, total: MEMBERS.length }),
  'GET /api/team/invitations': () => json({ items: [INVITATION], total: 1 }),
};

function asAdmin(answers: Parameters<typeof fakeServer>[0] = {}) {
  const asked = fakeServer({
    'GET /api/auth/me': () => json(sessionOf('admin')),
    ...LISTS,
    ...answers,
  });
  renderApp('/team');
  return (route: string) => asked.filter((one) => one.route === route);
}

describe('the team’s page', () => {
  it('has an admin change roles in their place, and says why one can’t be taken', async () => {
    const detail = 'This member holds the team’s plan: hand the team over first.';
    const told = asAdmin({
      'PATCH /api/team/members/9': () => json({ ...MEMBERS[2], roles: ['engineer', 'reviewer'] }),
      'PATCH /api/team/members/7': () => problem(409, 'team.owner', { detail }),
    });
    await userEvent.click(await screen.findByLabelText('Roles of Jonas Hartwell'));
    await userEvent.click(await screen.findByTitle('reviewer'));
    await waitFor(() => expect(told('PATCH /api/team/members/9')).toHaveLength(1));
    expect(told('PATCH /api/team/members/9')[0].body).toEqual({ roles: ['engineer', 'reviewer'] });
    expect(await screen.findByText('Jonas Hartwell is now engineer, reviewer')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(told('PATCH /api/team/members/9')).toHaveLength(2));
    expect(told('PATCH /api/team/members/9')[1].body).toEqual({ roles: ['engineer'] });

    const own = screen.getByLabelText('Roles of Ada Merrow');
    await userEvent.click(own);
    await userEvent.keyboard('{Backspace}');
    expect(await screen.findByText('A member has at least one role.')).toBeInTheDocument();
    expect(told('PATCH /api/team/members/7')).toHaveLength(0);
    await userEvent.click((await screen.findAllByTitle('engineer')).at(-1)!);
    expect(await screen.findByText(detail)).toBeInTheDocument();
  });

  it('asks before a member is removed, by keyboard too, and offers no way to remove oneself', async () => {
    let items = MEMBERS;
    const told = asAdmin({
      'GET /api/team/members': () => json({ items, total: items.length }),
      'DELETE /api/team/members/9': () => {
        items = MEMBERS.slice(0, 2);
        return new Response(null, { status: 204 });
      },
    });
    const remove = await screen.findByRole('button', { name: 'Remove Jonas Hartwell' });
    remove.focus();
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(screen.getByRole('button', { name: 'Cancel' })).toHaveFocus());
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(remove).toHaveFocus());
    await userEvent.keyboard('{Enter}');
    expect(await screen.findByText('Their work stays, and their session ends at once.')).toBeInTheDocument();
    expect(told('DELETE /api/team/members/9')).toHaveLength(0);
    await waitFor(() => expect(screen.getByRole('button', { name: 'Cancel' })).toHaveFocus());
    await userEvent.keyboard('{Tab}{Enter}');
    await waitFor(() => expect(told('DELETE /api/team/members/9')).toHaveLength(1));
    await waitFor(() => expect(screen.getByRole('heading', { name: '2 members' })).toHaveFocus());
    expect(screen.queryByRole('button', { name: 'Remove Ada Merrow' })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Hand over to Jonas Hartwell' })).toBeNull();
    expect(screen.getByRole('button', { name: 'Hand over to Tobias Fenn' })).toBeInTheDocument();
  });

  it('sends an invitation, and leads to the plan where no seat is left', async () => {
    let seats = 1;
    const told = asAdmin({
      'POST /api/team/invitations': () =>
        seats-- > 0 ? json(INVITATION, 201) : problem(402, 'access.seats', { detail: '3 seats are taken.' }),
    });
    await userEvent.type(await screen.findByLabelText('E-mail'), 'nell@weir.example{Enter}');
    expect(await screen.findByText(/is on its way to nell@weir.example/)).toBeInTheDocument();
    expect(told('POST /api/team/invitations')[0].body).toEqual({
      email: 'nell@weir.example',
      roles: ['engineer'],
    });
    await userEvent.type(screen.getByLabelText('E-mail'), 'more@weir.example{Enter}');
    const refusal = await screen.findByRole('alert');
    expect(refusal).toHaveTextContent('3 seats are taken.');
    expect(within(refusal).getByRole('link')).toHaveAttribute('href', '/team/plan?add');
  });

  it('offers an admin to take the plan over from who holds it', async () => {
    const [own, other] = MEMBERS;
    const items = [
      { ...own, isOwner: false },
      { ...other, isOwner: true },
    ];
    const told = asAdmin({
      'GET /api/team/members': () => json({ items, total: 2 }),
      'POST /api/team/owner': () => new Response(null, { status: 204 }),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Take over the plan' }));
    expect(await screen.findByText(/^You hold the plan from then on/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Take over' }));
    await waitFor(() => expect(told('POST /api/team/owner')).toHaveLength(1));
    expect(told('POST /api/team/owner')[0].body).toEqual({ memberId: '7' });
  });

  it('shows other members who is in the team, and nothing to change', async () => {
    fakeServer({ 'GET /api/auth/me': () => json(sessionOf('engineer')), ...LISTS });
    renderApp('/team');
    const row = await screen.findByRole('row', { name: /Tobias Fenn/ });
    expect(row).toHaveTextContent('team admin, librarian');
    expect(screen.queryByLabelText('E-mail')).toBeNull();
    expect(screen.queryByRole('link', { name: 'Audit trail' })).toBeNull();
    expect(screen.getAllByRole('button').map(({ textContent }) => textContent)).toEqual(['Leave the team']);
  });
});
