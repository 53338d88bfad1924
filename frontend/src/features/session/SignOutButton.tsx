import { Button } from 'antd';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useSignOut } from './useSignOut';

export function SignOutButton() {
  const signOut = useSignOut();
  return (
    <div>
      <Button onClick={() => signOut.mutate()} loading={signOut.isPending}>
        Sign out
      </Button>
      {signOut.error && <FieldMessage>{detailOf(signOut.error)}</FieldMessage>}
    </div>
  );
}
