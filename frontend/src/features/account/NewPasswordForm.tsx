import { Button, Form, Input } from 'antd';
import { resetPassword } from '../../api/account';
import { NEW_PASSWORD, PASSWORD_HINT } from '../../components/accountRules';
import { FormProblem } from '../../components/FormProblem';
import { useFormAct } from '../../components/useFormAct';

interface NewPasswordFormProps {
  token: string;
  email: string;
  onDone: () => void;
}

/** Sets a new password by the link of an e-mail. */
export function NewPasswordForm({ token, email, onDone }: NewPasswordFormProps) {
  const { form, submit, isPending, problem } = useFormAct<{ password: string }>(
    ({ password }) => resetPassword({ token, password }),
    onDone,
  );
  return (
    <Form<{ password: string }>
      form={form}
      layout="vertical"
      requiredMark={false}
      noValidate
      aria-label="New password"
      onFinish={(given) => submit(given)}
    >
      <FormProblem problem={problem} />
      <Form.Item label="Account" htmlFor="new-password-account">
        <Input
          id="new-password-account"
          value={email}
          autoComplete="username"
          readOnly
          variant="borderless"
        />
      </Form.Item>
      <Form.Item name="password" label="New password" rules={NEW_PASSWORD} extra={PASSWORD_HINT}>
        <Input.Password autoComplete="new-password" autoFocus />
      </Form.Item>
      <Button type="primary" htmlType="submit" block loading={isPending}>
        Set the password
      </Button>
    </Form>
  );
}
