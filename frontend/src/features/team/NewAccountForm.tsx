import { Button, Form, Input } from 'antd';
import type { NewAccount } from '../../api/invitation';
import { needed, NEW_PASSWORD, PASSWORD_HINT } from '../../components/accountRules';
import { FormProblem } from '../../components/FormProblem';
import { useFormAct } from '../../components/useFormAct';
import { useJoin } from './useJoin';

interface NewAccountFormProps {
  token: string;
  email: string;
}

/** A new account for the invited address: its link has shown whose address it is. */
export function NewAccountForm({ token, email }: NewAccountFormProps) {
  const { form, submit, isPending, problem } = useFormAct<NewAccount>(useJoin(token, email));
  return (
    <Form<NewAccount>
      form={form}
      layout="vertical"
      requiredMark={false}
      aria-label="New account"
      onFinish={(account) => submit(account)}
    >
      <FormProblem problem={problem} />
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <Form.Item name="name" label="Your name" rules={needed('Your name is needed')}>
        <Input autoComplete="name" maxLength={120} autoFocus />
      </Form.Item>
      <Form.Item name="password" label="Password" rules={NEW_PASSWORD} extra={PASSWORD_HINT}>
        <Input.Password autoComplete="new-password" maxLength={200} />
      </Form.Item>
      <Button type="primary" htmlType="submit" block loading={isPending}>
        Make the account and join
      </Button>
    </Form>
  );
}
