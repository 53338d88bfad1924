import { PASSWORD_LEAST, passwordLengthFault } from '@roothertz/common/accounts';
import { Alert, Button, Form, Input } from 'antd';
import type { NewAccount } from '../../api/invitation';
import { detailOf } from '../../api/problem';
import { useJoin } from './useJoin';

interface NewAccountFormProps {
  token: string;
  email: string;
}

/** A new account for the invited address: its link has shown whose address it is. */
export function NewAccountForm({ token, email }: NewAccountFormProps) {
  const join = useJoin(token, email);
  return (
    <Form<NewAccount>
      layout="vertical"
      requiredMark={false}
      aria-label="New account"
      onFinish={(account) => join.mutate(account)}
    >
      {join.error && (
        <Form.Item>
          <Alert type="error" role="alert" title={detailOf(join.error)} />
        </Form.Item>
      )}
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <Form.Item
        name="name"
        label="Your name"
        rules={[{ required: true, whitespace: true, message: 'Your name is needed' }]}
      >
        <Input autoComplete="name" maxLength={120} autoFocus />
      </Form.Item>
      <Form.Item
        name="password"
        label="Password"
        extra={`At least ${PASSWORD_LEAST} characters; several words make a good one.`}
        rules={[{ validator: (_, password: string = '') => faultOf(password) }]}
      >
        <Input.Password autoComplete="new-password" maxLength={200} />
      </Form.Item>
      <Button type="primary" htmlType="submit" block loading={join.isPending}>
        Make the account and join
      </Button>
    </Form>
  );
}

function faultOf(password: string): Promise<void> {
  const fault = passwordLengthFault(password);
  return fault === null ? Promise.resolve() : Promise.reject(new Error(fault));
}
