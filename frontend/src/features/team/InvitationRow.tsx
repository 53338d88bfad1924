import { Button } from 'antd';
import { detailOf } from '../../api/problem';
import type { Invitation } from '../../api/team';
import { FieldMessage } from '../../components/FieldMessage';
import { formatDay } from '../../components/formatDay';
import { moment } from '../../components/moments';
import styles from './Team.module.css';
import { rolesText } from './teamWords';
import { useResend, useRevoke } from './useTeamActs';

export function InvitationRow({ invitation }: { invitation: Invitation }) {
  const { id, email, roles, invitedBy, sentAt, expiresAt } = invitation;
  const [resend, revoke] = [useResend(), useRevoke()];
  const error = resend.error ?? revoke.error;
  const isOver = new Date(expiresAt) <= new Date();
  return (
    <tr>
      <th scope="row">{email}</th>
      <td>{rolesText(roles)}</td>
      <td>
        {moment(sentAt)}
        <span className={styles.note}>
          by {invitedBy?.name ?? 'a former member'},{' '}
          <span className={isOver ? styles.over : undefined}>
            {isOver ? 'too old since' : 'good until'} {formatDay(expiresAt)}
          </span>
        </span>
      </td>
      <td className={styles.acts}>
        <Button
          size="small"
          aria-label={`Send again to ${email}`}
          loading={resend.isPending}
          onClick={() => resend.mutate(id)}
        >
          Send again
        </Button>
        <Button
          size="small"
          aria-label={`Withdraw the invitation of ${email}`}
          loading={revoke.isPending}
          onClick={() => revoke.mutate(id)}
        >
          Withdraw
        </Button>
        {error && <FieldMessage>{detailOf(error)}</FieldMessage>}
      </td>
    </tr>
  );
}
