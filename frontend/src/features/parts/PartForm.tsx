import { type FieldError, INPUT_TYPE_FIELD, OP_AMP_PARAMETERS, PART_FIELDS } from '@roothertz/common/parts';
import { Alert, Button, Form } from 'antd';
import { useEffect, type ReactNode } from 'react';
import { ParameterItem } from './ParameterItem';
import type { PartDraft } from './partDraft';
import styles from './PartForm.module.css';
import { PartTextItem } from './PartTextItem';
import { usePartForm } from './usePartForm';

interface PartFormProps {
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

/** The form of an op-amp, made from the catalogues: a new parameter appears here by itself. */
export function PartForm({
  initial,
  saveLabel,
  isSaving,
  refusal,
  onSave,
  onChange,
  children,
}: PartFormProps) {
  const { form, rest, onInvalid, onFinish, onFinishFailed, showErrors } = usePartForm(onSave);
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
      aria-label="Op-amp"
    >
      <section>
        <h2 className={styles.heading}>Part</h2>
        {PART_FIELDS.map((field) => (
          <PartTextItem key={field.key} field={field} name={[field.key]} />
        ))}
        <PartTextItem field={INPUT_TYPE_FIELD} name={['amplifier', INPUT_TYPE_FIELD.key]} />
      </section>
      <section>
        <h2 className={styles.heading}>Parameters of one amplifier</h2>
        <div className={styles.parameters}>
          {OP_AMP_PARAMETERS.map((parameter) => (
            <ParameterItem key={parameter.key} parameter={parameter} onInvalid={onInvalid} />
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
