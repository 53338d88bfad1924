import { Button, Form, Input } from 'antd';
import { type SignUp, signUp } from '../../api/account';
import { ADDRESS, needed, NEW_PASSWORD, PASSWORD_HINT } from '../../components/accountRules';
import { FormProblem } from '../../components/FormProblem';
import { useFormAct } from '../../components/useFormAct';

/** Asks for an account of one's own, with a team of one's own. */
export function SignUpForm({ onSent }: { onSent: (asked: SignUp) => void }) {
  const { form, submit, isPending, problem } = useFormAct<SignUp>(async (asked) => {
    await signUp(asked);
    onSent(asked);
  });
  return (
    <Form<SignUp>
      form={form}
      layout="vertical"
      requiredMark={false}
      noValidate
      aria-label="Sign up"
      onFinish={(asked) => submit(asked)}
    >
      <FormProblem problem={problem} />
      <Form.Item name="name" label="Your name" rules={needed('Your name is needed')}>
        <Input autoComplete="name" maxLength={120} autoFocus />
      </Form.Item>
      <Form.Item name="email" label="E-mail" rules={ADDRESS}>
        <Input type="email" autoComplete="username" maxLength={254} />
      </Form.Item>
      <Form.Item name="password" label="Password" rules={NEW_PASSWORD} extra={PASSWORD_HINT}>
        <Input.Password autoComplete="new-password" />
      </Form.Item>
      <Form.Item
        name="teamName"
        label="Your team’s name"
        rules={needed('A name for your team is needed')}
        extra="You become its admin, on the Free plan. To join a team that is here already, ask its admin for an invitation."
      >
        <Input autoComplete="organization" maxLength={120} />
      </Form.Item>
      <Button type="primary" htmlType="submit" block loading={isPending}>
        Sign up
      </Button>
    </Form>
  );
}
