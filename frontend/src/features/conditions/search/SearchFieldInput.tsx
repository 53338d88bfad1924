import { useEffect } from 'react';
import { QuantityInput } from '../../../components/QuantityInput';
import { useConditionsForm } from '../ConditionsContext';
import type { SearchKeys } from './searchAddress';
import styles from './SearchFields.module.css';
import type { SearchForm } from './useSearchAddress';

interface SearchFieldInputProps<Keys extends SearchKeys> {
  form: SearchForm<Keys>;
  name: keyof Keys & string;
  label: string;
}

/** A field in the line above a ranking, with its label in front. */
export function SearchFieldInput<Keys extends SearchKeys>({
  form,
  name,
  label,
}: SearchFieldInputProps<Keys>) {
  const { messages, reportDraft } = useConditionsForm();
  const { field, path } = form.keys[name];
  useEffect(() => () => reportDraft(path, null), [path, reportDraft]);
  return (
    <span>
      <span className={styles.label}>{label}</span>
      <QuantityInput
        variant="inline"
        id={path}
        field={field}
        value={form.values[name]}
        error={messages.get(path) ?? form.messages.get(path)}
        onCommit={(value) => form.change({ [name]: value! } as Partial<Record<keyof Keys, number>>)}
        onInvalid={(message) => reportDraft(path, message)}
      />
    </span>
  );
}
