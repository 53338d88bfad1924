import { type TextField, readText } from '@roothertz/common/parts';
import { Form, Input, Select } from 'antd';
import { selectOptions } from '../../components/optionLabels';

const LONGEST_LINE = 200;

interface PartTextItemProps {
  field: TextField;
  name: string[];
}

/** A text or a choice of words of a part, as its catalogue entry says. */
export function PartTextItem({ field, name }: PartTextItemProps) {
  const isUnknowable = field.options !== undefined && field.fallback === null;
  return (
    <Form.Item
      name={name}
      label={field.label}
      required={field.required}
      rules={field.options ? [] : [{ validator: (_rule, text: string) => checkText(field, text) }]}
      normalize={(value: unknown) => value ?? (isUnknowable ? null : '')}
    >
      {field.options ? (
        <Select
          options={selectOptions(field.key, field.options)}
          allowClear={isUnknowable}
          placeholder={isUnknowable ? 'unknown' : undefined}
        />
      ) : field.maxLength > LONGEST_LINE ? (
        <Input.TextArea rows={3} />
      ) : (
        <Input autoComplete="off" />
      )}
    </Form.Item>
  );
}

async function checkText(field: TextField, text: string): Promise<void> {
  const reading = readText(field, text ?? '');
  if (!reading.ok) throw new Error(reading.message);
}
