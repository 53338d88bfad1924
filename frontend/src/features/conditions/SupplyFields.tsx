import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { parseQuantity, type Range } from '@roothertz/common/units';
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
  const setBoth = ({ from, to }: Range) => change('filter.supply', { minimum: from, maximum: to });
  const endOf = (end: End) => <SupplyEnd end={end} onCommit={(value) => set(end, value)} onRange={setBoth} />;
  return supply === undefined ? (
    endOf('minimum')
  ) : (
    <>
      {endOf('minimum')} to {endOf('maximum')}
    </>
  );
}

/** "±5 V" is a supply of 10 V from rail to rail. */
function railToRail(typed: string): string {
  const half = /^\s*(?:±|\+\/-)(.+)$/.exec(typed)?.[1];
  const parsed = half === undefined ? null : parseQuantity(half, 'voltage');
  return parsed?.ok ? `${2 * parsed.value} V` : typed;
}

interface SupplyEndProps {
  end: End;
  onCommit: (value: number | null) => void;
  onRange: (range: Range) => void;
}

function SupplyEnd({ end, ...taking }: SupplyEndProps) {
  const { request, messages, reportDraft } = useConditionsForm();
  const path = `filter.supply.${end}` as const;
  return (
    <QuantityInput
      variant="inline"
      field={CONDITION_FIELDS[path]}
      value={request.filter?.supply?.[end] ?? null}
      emptyText="any"
      error={messages.get(path)}
      spell={railToRail}
      {...taking}
      onInvalid={(message) => reportDraft(path, message)}
    />
  );
}
