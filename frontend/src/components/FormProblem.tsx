import { Alert, Form } from 'antd';

/** What is wrong with a form as a whole. */
export function FormProblem({ problem }: { problem: string | null }) {
  if (problem === null) return null;
  return (
    <Form.Item>
      <Alert type="error" title={problem} role="alert" />
    </Form.Item>
  );
}
