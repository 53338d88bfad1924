import { useEffect, useState } from 'react';
import styles from './ConditionList.module.css';
import { useConditionsForm } from './ConditionsContext';
import { valueAt } from './requestPath';

interface FilterTextProps {
  path: 'filter.search' | 'filter.package';
  label: string;
  emptyText: string;
  id?: string;
}

const PAUSE = 250;

/** A text that narrows the parts while it is typed, after a short pause. */
export function FilterText({ path, label, emptyText, id }: FilterTextProps) {
  const { request, change } = useConditionsForm();
  const value = (valueAt(request, path) as string | undefined) ?? '';
  const [draft, setDraft] = useState<string | null>(null);
  useEffect(() => {
    if (draft === null) return;
    const timer = setTimeout(() => {
      if (draft.trim() !== value) change(path, draft.trim());
    }, PAUSE);
    return () => clearTimeout(timer);
  }, [draft, value, path, change]);
  const take = () => {
    if (draft !== null && draft.trim() !== value) change(path, draft.trim());
    setDraft(null);
  };
  return (
    <input
      id={id}
      type="text"
      role="searchbox"
      className={styles.text}
      aria-label={label}
      placeholder={emptyText}
      autoComplete="off"
      spellCheck={false}
      maxLength={100}
      value={draft ?? value}
      onChange={(event) => setDraft(event.target.value)}
      onBlur={take}
      onKeyDown={(event) => {
        if (event.key === 'Enter') take();
        if (event.key === 'Escape') setDraft('');
      }}
    />
  );
}
