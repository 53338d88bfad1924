import type { QueryClient } from '@tanstack/react-query';
import { Alert, Button, Form, Input, type InputRef } from 'antd';
import type { Ref } from 'react';
import { Link } from 'react-router-dom';
import type { Credentials, Session } from '../../api/session';
import { signInMessage } from './signInMessage';
import { useSignIn } from './useSignIn';

interface SignInFormProps {
  /** What is done with the session; left out = all that was loaded before it is forgotten. */
  take?: (queryClient: QueryClient, session: Session) => void | Promise<void>;
  /** Who is expected, where that is known. */
  email?: string;
  /** Where the password is written. */
  passwordRef?: Ref<InputRef>;
}

export function SignInForm({ take, email, passwordRef }: SignInFormProps) {
  const { signIn, isPending, error, wait } = useSignIn(take);
  const message = signInMessage(error, wait);
  return (
    <Form<Credentials>
      name="sign-in"
      layout="vertical"
      requiredMark={false}
      initialValues={{ email }}
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
        <Input type="email" autoComplete="username" autoFocus={email === undefined} />
      </Form.Item>
      <Form.Item
        name="password"
        label="Password"
        rules={[{ required: true, message: 'Your password is needed' }]}
        extra={
          <Link to="/reset-password" target={take && '_blank'}>
            Forgotten?
          </Link>
        }
      >
        <Input.Password ref={passwordRef} autoComplete="current-password" />
      </Form.Item>
      <Button type="primary" htmlType="submit" block disabled={wait > 0} loading={isPending}>
        Sign in
      </Button>
    </Form>
  );
}
