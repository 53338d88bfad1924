import { QUANTITIES } from '@roothertz/common/units';
import { Input } from 'antd';
import { useId } from 'react';
import styles from './QuantityInput.module.css';
import { useQuantityDraft, type DraftOptions } from './useQuantityDraft';

export interface QuantityInputProps extends DraftOptions {
  variant?: 'inline' | 'form';
  /** The accessible name; left out = the field's label. Empty = a label element names it. */
  label?: string;
  /** What is wrong according to somebody else, such as the server. */
  error?: string | null;
  id?: string;
  disabled?: boolean;
}

/** A field that reads engineering input such as "4k7": Enter or leaving commits, Escape reverts. */
export function QuantityInput({
  variant = 'form',
  label,
  error,
  id,
  disabled,
  ...options
}: QuantityInputProps) {
  const { field, emptyText } = options;
  const draft = useQuantityDraft(options);
  const messageId = useId();
  const message = draft.message ?? error ?? null;
  const control = {
    id,
    disabled,
    value: draft.text,
    title: field.help,
    placeholder: emptyText ?? QUANTITIES[field.kind].example,
    autoComplete: 'off',
    spellCheck: false,
    'aria-label': label === '' ? undefined : (label ?? field.label),
    'aria-invalid': message !== null,
    'aria-describedby': message === null ? undefined : messageId,
    onChange: (event: React.ChangeEvent<HTMLInputElement>) => draft.change(event.target.value),
    onFocus: (event: React.FocusEvent<HTMLInputElement>) => event.target.select(),
    onBlur: draft.commit,
    onKeyDown: draft.onKeyDown,
  };
  return (
    <span className={variant === 'inline' ? styles.inline : styles.form}>
      {variant === 'inline' ? (
        <input {...control} type="text" className={styles.text} size={Math.max(2, draft.text.length)} />
      ) : (
        <Input {...control} status={message === null ? '' : 'error'} />
      )}
      {message !== null && (
        <span id={messageId} role="alert" className={styles.message}>
          {message}
        </span>
      )}
    </span>
  );
}
