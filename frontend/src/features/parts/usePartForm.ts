import type { FieldError } from '@roothertz/common/parts';
import { Form, type FormInstance } from 'antd';
import { useCallback, useRef, useState } from 'react';
import type { KindOfPart } from './kindOfPart';
import type { PartDraft } from './partDraft';

/** The state of a part's form: what can't be read, what the server refused, and when it can be saved. */
export function usePartForm({ catalogue: { group }, check }: KindOfPart, onSave: (draft: PartDraft) => void) {
  const [form] = Form.useForm<PartDraft>();
  const [rest, setRest] = useState<readonly string[]>([]);
  const unreadable = useRef(new Set<string>());

  const onInvalid = useCallback((key: string, message: string | null) => {
    if (message === null) unreadable.current.delete(key);
    else unreadable.current.add(key);
  }, []);
  const showErrors = useCallback(
    (errors: readonly FieldError[], detail?: string) => {
      const strangers = placeErrors(form, errors).map(({ message }) => message);
      setRest(errors.length === 0 && detail !== undefined ? [detail] : strangers);
    },
    [form],
  );
  const onFinish = () => {
    const [first] = unreadable.current;
    if (first !== undefined) return focusField(form, [group, first]);
    const draft = form.getFieldsValue(true) as PartDraft;
    const errors = check(draft);
    showErrors(errors);
    if (errors.length === 0) onSave(draft);
  };
  const onFinishFailed = ({ errorFields }: { errorFields: { name: (string | number)[] }[] }) => {
    if (errorFields.length > 0) focusField(form, errorFields[0].name);
  };
  return { form, rest, onInvalid, onFinish, onFinishFailed, showErrors };
}

/** Puts errors at their fields; gives back those whose field the form doesn't have. */
function placeErrors(form: FormInstance<PartDraft>, errors: readonly FieldError[]): FieldError[] {
  const placed = errors.filter(({ field }) => form.getFieldInstance(field.split('.')) !== undefined);
  form.setFields(
    placed.map(({ field, message }) => ({ name: field.split('.') as never, errors: [message] })),
  );
  if (placed.length > 0) focusField(form, placed[0].field.split('.'));
  return errors.filter((error) => !placed.includes(error));
}

function focusField(form: FormInstance<PartDraft>, name: (string | number)[]): void {
  form.scrollToField(name as never, { block: 'center', focus: true });
}
