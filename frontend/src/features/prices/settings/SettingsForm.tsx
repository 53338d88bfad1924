import { CURRENCIES, OFFER_FIELDS } from '@roothertz/common/prices';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button, Form, Select } from 'antd';
import { useState } from 'react';
import { type PriceSettings, saveSettings } from '../../../api/prices';
import { detailOf } from '../../../api/problem';
import { FieldMessage } from '../../../components/FieldMessage';
import { QuantityInput } from '../../../components/QuantityInput';

interface SettingsFormProps {
  settings: PriceSettings;
  mayEdit: boolean;
}

const CURRENCY_OPTIONS = CURRENCIES.map((value) => ({ value, label: value }));

export function SettingsForm({ settings, mayEdit }: SettingsFormProps) {
  const queryClient = useQueryClient();
  const [draft, setDraft] = useState(settings);
  const save = useMutation({
    mutationFn: () => saveSettings(draft),
    onSuccess: () => queryClient.invalidateQueries(),
  });
  const isSame = draft.currency === settings.currency && draft.staleAfterDays === settings.staleAfterDays;
  return (
    <Form layout="vertical" onFinish={() => save.mutate()} disabled={!mayEdit}>
      <Form.Item label="The team’s currency" htmlFor="team-currency">
        <Select
          id="team-currency"
          showSearch
          options={CURRENCY_OPTIONS}
          value={draft.currency}
          onChange={(currency: string) => setDraft({ ...draft, currency })}
        />
      </Form.Item>
      <Form.Item label="A price is stale so many days after its last confirmation" htmlFor="stale-after">
        <QuantityInput
          id="stale-after"
          label=""
          field={OFFER_FIELDS.staleAfterDays}
          value={draft.staleAfterDays}
          disabled={!mayEdit}
          onCommit={(days) => days !== null && setDraft({ ...draft, staleAfterDays: days })}
        />
      </Form.Item>
      {mayEdit && (
        <Button htmlType="submit" disabled={isSame} loading={save.isPending}>
          Save the settings
        </Button>
      )}
      {save.error && <FieldMessage>{detailOf(save.error)}</FieldMessage>}
    </Form>
  );
}
