import { useQueryClient } from '@tanstack/react-query';
import { Form, Input } from 'antd';
import { changeAddress, changePassword, openSessionsQuery, renameAccount } from '../../api/account';
import { SESSION_KEY } from '../../api/session';
import { useMember } from '../../components/useMember';
import styles from './Account.module.css';
import { AccountForm } from './AccountForm';
import { Change } from './Change';
import { ADDRESS, needed, NEW_PASSWORD, PASSWORD_HINT } from '../../components/accountRules';
import { PasswordItem } from './PasswordItem';

/** Name, address and password, each with the form that changes it. */
export function OwnFacts() {
  return (
    <ul className={styles.rows} aria-label="Account">
      <NameFact />
      <AddressFact />
      <PasswordFact />
    </ul>
  );
}

function NameFact() {
  const { name } = useMember().user;
  const queryClient = useQueryClient();
  const rename = async (values: { name: string }) => {
    await renameAccount(values);
    await queryClient.invalidateQueries({ queryKey: SESSION_KEY });
  };
  return (
    <Change term="Name" value={name} verb="Change">
      {(close) => (
        <AccountForm
          label="Name"
          verb="Save the name"
          initial={{ name }}
          act={rename}
          onDone={() => close('Saved.')}
        >
          <Form.Item name="name" label="Your name" rules={needed('Your name is needed')}>
            <Input autoFocus autoComplete="name" maxLength={120} />
          </Form.Item>
        </AccountForm>
      )}
    </Change>
  );
}

const ASKED =
  'We have sent an e-mail to the new address. When you open its link, the address changes; until then all stays as it is.';

function AddressFact() {
  return (
    <Change term="E-mail" value={useMember().user.email} verb="Change">
      {(close) => (
        <AccountForm
          label="E-mail"
          verb="Ask the new address"
          act={changeAddress}
          onDone={() => close(ASKED)}
        >
          <Form.Item name="email" label="New e-mail" rules={ADDRESS}>
            <Input autoFocus type="email" autoComplete="email" maxLength={254} />
          </Form.Item>
          <PasswordItem name="password" label="Your password" />
        </AccountForm>
      )}
    </Change>
  );
}

function PasswordFact() {
  const queryClient = useQueryClient();
  const done = 'The password is changed, and your other sessions are over.';
  return (
    <Change term="Password" value="not shown" verb="Change">
      {(close) => (
        <AccountForm
          label="Password"
          verb="Change the password"
          act={changePassword}
          onDone={() => {
            close(done);
            void queryClient.invalidateQueries({ queryKey: openSessionsQuery.queryKey });
          }}
        >
          <PasswordItem name="currentPassword" label="Current password" autoFocus />
          <Form.Item name="newPassword" label="New password" rules={NEW_PASSWORD} extra={PASSWORD_HINT}>
            <Input.Password autoComplete="new-password" />
          </Form.Item>
        </AccountForm>
      )}
    </Change>
  );
}
