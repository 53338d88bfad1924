import { useMutation } from '@tanstack/react-query';
import { Form, type FormInstance } from 'antd';
import { ApiProblem, detailOf } from '../api/problem';

/** Sends a form; what the server refuses stands at the field, and what belongs to none above the form. */
export function useFormAct<Values extends object>(
  act: (values: Values) => Promise<void>,
  onDone?: () => void,
) {
  const [form] = Form.useForm<Values>();
  const mutation = useMutation({
    mutationFn: act,
    onSuccess: () => {
      form.resetFields();
      onDone?.();
    },
    onError: (error) => showAtFields(form, error),
  });
  const error = mutation.error && !isAtFields(form, mutation.error) ? mutation.error : null;
  return {
    form,
    submit: mutation.mutate,
    isPending: mutation.isPending,
    isDone: mutation.isSuccess,
    error,
    problem: error && detailOf(error),
  };
}

function showAtFields<Values extends object>(form: FormInstance<Values>, error: Error): void {
  if (!isAtFields(form, error)) return;
  const errors = (error as ApiProblem).errors;
  (form as FormInstance).setFields(errors.map(({ field, message }) => ({ name: field, errors: [message] })));
  (form as FormInstance).focusField?.(errors[0].field);
}

function isAtFields<Values extends object>(form: FormInstance<Values>, error: Error): boolean {
  if (!(error instanceof ApiProblem) || error.errors.length === 0) return false;
  const fields = Object.keys(form.getFieldsValue(true) as object);
  return error.errors.every(({ field }) => fields.includes(field));
}
