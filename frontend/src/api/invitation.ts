import { queryOptions } from '@tanstack/react-query';
import { answer, client } from './client';
import type { components } from './schema';

type Schemas = components['schemas'];

export type OpenInvitation = Schemas['OpenInvitationDto'];
export type NewAccount = Schemas['JoinTeamDto'];

/** The invitation that a link is for. */
export function openInvitationQuery(token: string) {
  return queryOptions({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) =>
      answer(client.GET('/api/invitations/{token}', { params: { path: { token } }, signal })),
    staleTime: 0,
  });
}

/** The account that is signed in joins the team. */
export async function acceptInvitation(token: string): Promise<void> {
  await answer(client.POST('/api/invitations/{token}/accept', { params: { path: { token } } }));
}

/** A new account joins the team. */
export async function joinWithNewAccount(token: string, body: NewAccount): Promise<void> {
  await answer(client.POST('/api/invitations/{token}/account', { params: { path: { token } }, body }));
}
