import { Form, Input } from 'antd';
import { needed } from '../../components/accountRules';

interface PasswordItemProps {
  name: string;
  label: string;
  autoFocus?: boolean;
}

/** The password that is asked for again before something important. */
export function PasswordItem({ name, label, autoFocus }: PasswordItemProps) {
  return (
    <Form.Item name={name} label={label} rules={needed('Your password is needed')}>
      <Input.Password autoComplete="current-password" autoFocus={autoFocus} />
    </Form.Item>
  );
}
