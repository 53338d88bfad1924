import { type FieldError, PART_FIELDS } from '@roothertz/common/parts';
import { Alert, Button, Form } from 'antd';
import { useEffect, type ReactNode } from 'react';
import type { KindOfPart } from './kindOfPart';
import { ParameterItem } from './ParameterItem';
import type { PartDraft } from './partDraft';
import styles from './PartForm.module.css';
import { PartTextItem } from './PartTextItem';
import { usePartForm } from './usePartForm';

interface PartFormProps {
  kind: KindOfPart;
  initial: PartDraft;
  saveLabel: string;
  isSaving: boolean;
  /** What the server refused, and its sentence where it names no field. */
  refusal: { errors: readonly FieldError[]; detail: string } | null;
  onSave: (draft: PartDraft) => void;
  onChange: () => void;
  /** Links beside the save button. */
  children?: ReactNode;
}

/** The form of a part, made from the catalogues: a new parameter appears here by itself. */
export function PartForm({
  kind,
  initial,
  saveLabel,
  isSaving,
  refusal,
  onSave,
  onChange,
  children,
}: PartFormProps) {
  const { form, rest, onInvalid, onFinish, onFinishFailed, showErrors } = usePartForm(kind, onSave);
  const { group, choice, parameters } = kind.catalogue;
  useEffect(() => {
    if (refusal) showErrors(refusal.errors, refusal.detail);
  }, [refusal, showErrors]);
  return (
    <Form
      form={form}
      layout="vertical"
      initialValues={initial}
      onFinish={onFinish}
      onFinishFailed={onFinishFailed}
      onValuesChange={onChange}
      className={styles.form}
      aria-label={kind.title}
    >
      <section>
        <h2 className={styles.heading}>Part</h2>
        {PART_FIELDS.map((field) => (
          <PartTextItem key={field.key} field={field} name={[field.key]} />
        ))}
        <PartTextItem field={choice} name={[group, choice.key]} />
      </section>
      <section>
        <h2 className={styles.heading}>{kind.parametersTitle}</h2>
        <div className={styles.parameters}>
          {parameters.map((parameter) => (
            <ParameterItem key={parameter.key} group={group} parameter={parameter} onInvalid={onInvalid} />
          ))}
        </div>
      </section>
      <div className={styles.actions}>
        <Button type="primary" htmlType="submit" loading={isSaving}>
          {saveLabel}
        </Button>
        {children}
        {rest.map((message) => (
          <Alert key={message} type="error" title={message} role="alert" />
        ))}
      </div>
    </Form>
  );
}
