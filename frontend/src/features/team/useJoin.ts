import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { joinWithNewAccount, type NewAccount } from '../../api/invitation';
import { signIn, takeSession } from '../../api/session';

/** Makes the account, joins with it and signs it in. */
export function useJoin(token: string, email: string) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  return async (account: NewAccount) => {
    await joinWithNewAccount(token, account);
    takeSession(queryClient, await signIn({ email, password: account.password }));
    await navigate('/');
  };
}
