import { refusalOf, type Action } from '@roothertz/common/access';
import { createContext, use } from 'react';
import type { Session } from '../api/session';

export const MemberContext = createContext<Session | null>(null);

/** The signed-in member; only for what stands behind the sign-in. */
export function useMember(): Session {
  const member = use(MemberContext);
  if (member === null) throw new Error('No member is signed in here.');
  return member;
}

/** Whether the member's roles and the team's plan allow an action now. */
export function useMayDo(action: Action): boolean {
  return refusalOf(useMember(), action) === null;
}
