import { canBeUnknown, type ParameterDefinition, type ParameterGroup } from '@roothertz/common/parts';
import { Form, Select } from 'antd';
import { QuantityInput } from '../../components/QuantityInput';
import { ORIGIN_OPTIONS } from '../../components/optionLabels';
import styles from './PartForm.module.css';

interface ParameterItemProps {
  group: ParameterGroup;
  parameter: ParameterDefinition;
  onInvalid: (key: string, message: string | null) => void;
}

/** A parameter's figure and where it comes from. */
export function ParameterItem({ group, parameter, onInvalid }: ParameterItemProps) {
  const { key, label, help } = parameter;
  const isUnknowable = canBeUnknown(parameter);
  const rules = isUnknowable ? [] : [{ required: true, message: `${label}: a value is needed` }];
  return (
    <div className={styles.parameter}>
      <Form.Item
        name={[group, key]}
        label={parameterLabel(parameter)}
        tooltip={help}
        required={!isUnknowable}
        rules={rules}
        trigger="onCommit"
        validateTrigger="onCommit"
      >
        <FormQuantity
          field={parameter}
          emptyText={isUnknowable ? 'unknown' : undefined}
          onInvalid={(message) => onInvalid(key, message)}
        />
      </Form.Item>
      {hasOrigin(parameter) && (
        <Form.Item name={['origins', key]} label="origin">
          <Select
            options={ORIGIN_OPTIONS}
            placeholder="data sheet, typical"
            aria-label={`origin of ${label}`}
          />
        </Form.Item>
      )}
    </div>
  );
}

/** A count is what it is: nobody measures or estimates it. */
export function hasOrigin(parameter: ParameterDefinition): boolean {
  return parameter.kind !== 'count';
}

export function parameterLabel({ label, symbol }: ParameterDefinition): string {
  return symbol === undefined ? label : `${label} ${symbol}`;
}

type FormQuantityProps = Omit<React.ComponentProps<typeof QuantityInput>, 'value' | 'onCommit' | 'label'> &
  Partial<Pick<React.ComponentProps<typeof QuantityInput>, 'value' | 'onCommit'>>;

/** The quantity field as a form's control: the form gives it its value, its id and its label. */
function FormQuantity({ value = null, onCommit = () => undefined, ...props }: FormQuantityProps) {
  return <QuantityInput {...props} value={value} onCommit={onCommit} label="" />;
}
