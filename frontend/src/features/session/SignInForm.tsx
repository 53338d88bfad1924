import { Alert, Button, Form, Input } from 'antd';
import type { Credentials } from '../../api/session';
import { signInMessage } from './signInMessage';
import { useSignIn } from './useSignIn';

export function SignInForm() {
  const { signIn, isPending, error, wait } = useSignIn();
  const message = signInMessage(error, wait);
  return (
    <Form<Credentials>
      layout="vertical"
      requiredMark={false}
      onFinish={(credentials) => signIn(credentials)}
      aria-label="Sign in"
    >
      {message !== null && (
        <Form.Item>
          <Alert type="error" title={message} role="alert" />
        </Form.Item>
      )}
      <Form.Item
        name="email"
        label="E-mail"
        rules={[{ required: true, whitespace: true, message: 'Your e-mail address is needed' }]}
      >
        <Input type="email" autoComplete="username" autoFocus />
      </Form.Item>
      <Form.Item
        name="password"
        label="Password"
        rules={[{ required: true, message: 'Your password is needed' }]}
      >
        <Input.Password autoComplete="current-password" />
      </Form.Item>
      <Button type="primary" htmlType="submit" block disabled={wait > 0} loading={isPending}>
        Sign in
      </Button>
    </Form>
  );
}
