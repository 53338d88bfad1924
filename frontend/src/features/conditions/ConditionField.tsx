import type { ConditionFieldPath } from '@roothertz/common/conditions';
import type { Range } from '@roothertz/common/units';
import { useEffect } from 'react';
import { QuantityInput } from '../../components/QuantityInput';
import { useConditionsForm } from './ConditionsContext';
import { fieldOf } from './fieldOf';
import { valueAt } from './requestPath';

interface ConditionFieldProps {
  path: ConditionFieldPath;
  /** What the empty field means, such as "none"; left out = it can't be empty. */
  emptyText?: string;
  /** Takes both ends where a range is typed. */
  onRange?: (range: Range) => void;
}

/** A numeric field of the operating conditions, changed where it stands. */
export function ConditionField({ path, emptyText, onRange }: ConditionFieldProps) {
  const { request, messages, change, reportDraft } = useConditionsForm();
  const value = valueAt(request, path);
  const emptyValue = emptyText === 'auto' ? 'auto' : undefined;
  useEffect(() => () => reportDraft(path, null), [path, reportDraft]);
  return (
    <QuantityInput
      variant="inline"
      id={path}
      field={fieldOf(path, request.conditions.stage.topology)}
      value={typeof value === 'number' ? value : null}
      emptyText={emptyText}
      error={messages.get(path)}
      onRange={onRange}
      onCommit={(next) => change(path, next ?? emptyValue)}
      onInvalid={(message) => reportDraft(path, message)}
    />
  );
}
