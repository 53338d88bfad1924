import { queryOptions } from '@tanstack/react-query';
import type { Role } from '@roothertz/common/access';
import { answer, client } from './client';
import type { components } from './schema';

type Schemas = components['schemas'];

export type TeamMember = Schemas['TeamMemberDto'];
export type Invitation = Schemas['InvitationResponseDto'];

/** Everything that is known of who is in the team. */
export const TEAM_KEY = ['team'] as const;

export const teamMembersQuery = queryOptions({
  queryKey: [...TEAM_KEY, 'members'],
  queryFn: async ({ signal }) => (await answer(client.GET('/api/team/members', { signal }))).items,
});

/** The invitations that nobody has accepted or withdrawn. */
export const invitationsQuery = queryOptions({
  queryKey: [...TEAM_KEY, 'invitations'],
  queryFn: async ({ signal }) => (await answer(client.GET('/api/team/invitations', { signal }))).items,
});

export async function renameTeam(name: string): Promise<void> {
  await answer(client.PATCH('/api/team', { body: { name } }));
}

export async function handOverTeam(memberId: string): Promise<void> {
  await answer(client.POST('/api/team/owner', { body: { memberId } }));
}

export async function leaveTeam(): Promise<void> {
  await answer(client.DELETE('/api/team/membership'));
}

export function changeRoles(id: string, roles: Role[]): Promise<TeamMember> {
  return answer(client.PATCH('/api/team/members/{id}', { params: { path: { id } }, body: { roles } }));
}

export async function removeMember(id: string): Promise<void> {
  await answer(client.DELETE('/api/team/members/{id}', { params: { path: { id } } }));
}

export function inviteMember(body: Schemas['InviteMemberDto']): Promise<Invitation> {
  return answer(client.POST('/api/team/invitations', { body }));
}

export function resendInvitation(id: string): Promise<Invitation> {
  return answer(client.POST('/api/team/invitations/{id}/resend', { params: { path: { id } } }));
}

export async function revokeInvitation(id: string): Promise<void> {
  await answer(client.DELETE('/api/team/invitations/{id}', { params: { path: { id } } }));
}
