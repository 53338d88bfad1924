import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Checkbox, Skeleton } from 'antd';
import { changeMailPreference, mailPreferencesQuery, type NoticeKind } from '../../api/account';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Account.module.css';

/** Which notices the member wants by e-mail. */
export function MailPreferenceList() {
  const { data, error } = useQuery(mailPreferencesQuery);
  const change = useChange();
  if (error) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  if (!data) return <Skeleton title={false} paragraph={{ rows: 2 }} />;
  return (
    <div className={styles.stack}>
      {data.items.map(({ kind, label, wanted }) => (
        <Checkbox
          key={kind}
          checked={wanted}
          onChange={(event) => change.mutate({ kind, wanted: event.target.checked })}
        >
          {label}
        </Checkbox>
      ))}
      <p className={styles.quiet}>What concerns the account itself is always sent.</p>
      {change.error && <FieldMessage>{detailOf(change.error)}</FieldMessage>}
    </div>
  );
}

function useChange() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ kind, wanted }: { kind: NoticeKind; wanted: boolean }) =>
      changeMailPreference(kind, wanted),
    onSuccess: (preferences) => queryClient.setQueryData(mailPreferencesQuery.queryKey, preferences),
  });
}
