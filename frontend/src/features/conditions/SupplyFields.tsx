import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { QuantityInput } from '../../components/QuantityInput';
import { useConditionsForm } from './ConditionsContext';

type End = 'minimum' | 'maximum';

/** The range of the total supply voltage: both ends, or neither. */
export function SupplyFields() {
  const { request, change } = useConditionsForm();
  const supply = request.filter?.supply;
  const set = (end: End, value: number | null) =>
    change(
      'filter.supply',
      value === null ? undefined : { minimum: value, maximum: value, ...supply, [end]: value },
    );
  return supply === undefined ? (
    <SupplyEnd end="minimum" onCommit={(value) => set('minimum', value)} />
  ) : (
    <>
      <SupplyEnd end="minimum" onCommit={(value) => set('minimum', value)} /> to{' '}
      <SupplyEnd end="maximum" onCommit={(value) => set('maximum', value)} />
    </>
  );
}

function SupplyEnd({ end, onCommit }: { end: End; onCommit: (value: number | null) => void }) {
  const { request, messages, reportDraft } = useConditionsForm();
  const path = `filter.supply.${end}` as const;
  return (
    <QuantityInput
      variant="inline"
      field={CONDITION_FIELDS[path]}
      value={request.filter?.supply?.[end] ?? null}
      emptyText="any"
      error={messages.get(path)}
      onCommit={onCommit}
      onInvalid={(message) => reportDraft(path, message)}
    />
  );
}
