import { Button, Form, Input } from 'antd';
import { askForPasswordReset } from '../../api/account';
import { ADDRESS } from '../../components/accountRules';
import { FormProblem } from '../../components/FormProblem';
import { useFormAct } from '../../components/useFormAct';

/** Asks for a link by which a new password is set. */
export function ResetRequestForm({ onSent }: { onSent: (email: string) => void }) {
  const { form, submit, isPending, problem } = useFormAct<{ email: string }>(async (asked) => {
    await askForPasswordReset(asked);
    onSent(asked.email);
  });
  return (
    <Form<{ email: string }>
      form={form}
      layout="vertical"
      requiredMark={false}
      noValidate
      aria-label="New password"
      onFinish={(asked) => submit(asked)}
    >
      <FormProblem problem={problem} />
      <Form.Item name="email" label="E-mail" rules={ADDRESS}>
        <Input type="email" autoComplete="username" maxLength={254} autoFocus />
      </Form.Item>
      <Button type="primary" htmlType="submit" block loading={isPending}>
        Send a link
      </Button>
    </Form>
  );
}
