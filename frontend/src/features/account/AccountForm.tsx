import { Button, Form } from 'antd';
import type { ReactNode } from 'react';
import styles from './Account.module.css';
import { FormProblem } from '../../components/FormProblem';
import { useFormAct } from '../../components/useFormAct';

interface AccountFormProps<Values extends object> {
  label: string;
  verb: string;
  act: (values: Values) => Promise<void>;
  onDone: () => void;
  initial?: Partial<Values>;
  danger?: boolean;
  children: ReactNode;
}

/** A small form that changes something of the account. */
export function AccountForm<Values extends object>(props: AccountFormProps<Values>) {
  const { label, verb, act, onDone, initial, danger, children } = props;
  const { form, submit, isPending, problem } = useFormAct<Values>(act, onDone);
  return (
    <Form
      form={form}
      name={label.replaceAll(' ', '-')}
      className={styles.form}
      layout="vertical"
      requiredMark={false}
      noValidate
      aria-label={label}
      initialValues={initial}
      onFinish={(values: Values) => submit(values)}
    >
      <FormProblem problem={problem} />
      {children}
      <Button type="primary" htmlType="submit" danger={danger} loading={isPending}>
        {verb}
      </Button>
    </Form>
  );
}
