import { queryOptions } from '@tanstack/react-query';
import { answer, client } from './client';
import type { components } from './schema';

type Schemas = components['schemas'];

export type SignUp = Schemas['SignUpDto'];
export type OpenSession = Schemas['OpenSessionDto'];
export type OwnTeam = Schemas['OwnTeamDto'];
export type Departure = Schemas['DepartureDto'];
export type MailPreferences = Schemas['MailPreferencesDto'];
export type NoticeKind = Schemas['ChangeMailPreferenceDto']['kind'];

const ACCOUNT_KEY = 'account';

export const openSessionsQuery = queryOptions({
  queryKey: [ACCOUNT_KEY, 'sessions'],
  queryFn: ({ signal }) => answer(client.GET('/api/auth/sessions', { signal })),
});

export const ownTeamsQuery = queryOptions({
  queryKey: [ACCOUNT_KEY, 'teams'],
  queryFn: ({ signal }) => answer(client.GET('/api/auth/teams', { signal })),
});

export const mailPreferencesQuery = queryOptions({
  queryKey: [ACCOUNT_KEY, 'mail'],
  queryFn: ({ signal }) => answer(client.GET('/api/mail/preferences', { signal })),
});

/** What closing the account would mean for each team, as it stands now. */
export const closingQuery = queryOptions({
  queryKey: [ACCOUNT_KEY, 'closing'],
  queryFn: ({ signal }) => answer(client.GET('/api/account/closing', { signal })),
  staleTime: 0,
});

/** What a link in an e-mail is for. */
export function accountLinkQuery(token: string) {
  return queryOptions({
    queryKey: [ACCOUNT_KEY, 'link', token],
    queryFn: ({ signal }) =>
      answer(client.GET('/api/auth/links/{token}', { params: { path: { token } }, signal })),
    staleTime: Infinity,
  });
}

/** Which notices a link in an e-mail stops. */
export function unsubscriptionQuery(token: string) {
  return queryOptions({
    queryKey: [ACCOUNT_KEY, 'unsubscription', token],
    queryFn: ({ signal }) =>
      answer(client.GET('/api/mail/unsubscribe/{token}', { params: { path: { token } }, signal })),
    staleTime: Infinity,
  });
}

export async function unsubscribe(token: string): Promise<void> {
  await answer(client.POST('/api/mail/unsubscribe/{token}', { params: { path: { token } } }));
}

export async function signUp(body: SignUp): Promise<void> {
  await answer(client.POST('/api/auth/sign-up', { body }));
}

export async function askForPasswordReset(body: { email: string }): Promise<void> {
  await answer(client.POST('/api/auth/password-resets', { body }));
}

export async function confirmAddress(token: string): Promise<void> {
  await answer(client.POST('/api/auth/confirm', { body: { token } }));
}

export async function resetPassword(body: Schemas['ResetPasswordDto']): Promise<void> {
  await answer(client.POST('/api/auth/reset-password', { body }));
}

export async function renameAccount(body: { name: string }): Promise<void> {
  await answer(client.PATCH('/api/account', { body }));
}

export async function changePassword(body: Schemas['ChangePasswordDto']): Promise<void> {
  await answer(client.POST('/api/account/password', { body }));
}

export async function changeAddress(body: Schemas['ChangeAddressDto']): Promise<void> {
  await answer(client.POST('/api/account/email', { body }));
}

export async function closeAccount(body: { password: string }): Promise<void> {
  await answer(client.POST('/api/account/close', { body }));
}

export async function endSession(id: string): Promise<void> {
  await answer(client.DELETE('/api/auth/sessions/{id}', { params: { path: { id } } }));
}

export async function endOtherSessions(): Promise<void> {
  await answer(client.DELETE('/api/auth/sessions'));
}

export function changeMailPreference(kind: NoticeKind, wanted: boolean): Promise<MailPreferences> {
  return answer(client.PUT('/api/mail/preferences', { body: { kind, wanted } }));
}
