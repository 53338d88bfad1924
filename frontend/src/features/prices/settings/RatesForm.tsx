import { CURRENCIES, plainNumbers, readRate } from '@roothertz/common/prices';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button, Input, Select } from 'antd';
import { useState } from 'react';
import { type Rates, saveRates } from '../../../api/prices';
import { detailOf } from '../../../api/problem';
import { FieldMessage } from '../../../components/FieldMessage';
import { formatDay } from '../../../components/formatDay';
import styles from './RatesForm.module.css';

interface RatesFormProps {
  rates: Rates;
  mayEdit: boolean;
}

/** What a unit of each currency is worth in the team's; a rate that is saved holds from today on. */
export function RatesForm({ rates: { currency, items, missing }, mayEdit }: RatesFormProps) {
  const [added, setAdded] = useState<readonly string[]>([]);
  const [texts, setTexts] = useState<Readonly<Record<string, string>>>({});
  const known = new Map(items.map((rate) => [rate.currency, rate]));
  const shown = [...new Set([...items.map((rate) => rate.currency), ...missing, ...added])].sort();
  const before = (code: string) => shortRate(known.get(code)?.rate ?? '');
  const textOf = (code: string) => texts[code] ?? before(code);
  const changed = shown.filter((code) => textOf(code).trim() !== before(code));
  const save = useSaveRates();
  const rates = changed.map((code) => ({ currency: code, rate: textOf(code).trim() }));
  return (
    <section aria-label="Exchange rates" className={styles.rates}>
      <h2>Exchange rates</h2>
      {missing.length > 0 && (
        <p className={styles.missing}>Offers in {missing.join(', ')} don’t count until there is a rate.</p>
      )}
      {shown.map((code) => (
        <RateField
          key={code}
          code={code}
          base={currency}
          dated={known.get(code)?.dated}
          text={textOf(code)}
          isChanged={changed.includes(code)}
          disabled={!mayEdit}
          onChange={(text) => setTexts({ ...texts, [code]: text })}
        />
      ))}
      {shown.length === 0 && <p className={styles.quiet}>All offers are in {currency}: no rate is needed.</p>}
      {mayEdit && (
        <div className={styles.acts}>
          <Select
            showSearch
            aria-label="Add a currency"
            placeholder="Add a currency"
            value={null}
            options={CURRENCIES.filter((code) => code !== currency && !shown.includes(code)).map((value) => ({
              value,
            }))}
            onChange={(code: string | null) => code !== null && setAdded([...added, code])}
          />
          <Button
            disabled={rates.length === 0 || rates.some(({ rate }) => !readRate(rate).ok)}
            loading={save.isPending}
            onClick={() => save.mutate(rates)}
          >
            Save the rates
          </Button>
        </div>
      )}
      {save.error && <FieldMessage>{detailOf(save.error)}</FieldMessage>}
    </section>
  );
}

function useSaveRates() {
  const queryClient = useQueryClient();
  return useMutation({ mutationFn: saveRates, onSuccess: () => queryClient.invalidateQueries() });
}

interface RateFieldProps {
  code: string;
  base: string;
  dated: string | undefined;
  text: string;
  isChanged: boolean;
  disabled: boolean;
  onChange: (text: string) => void;
}

function RateField({ code, base, dated, text, isChanged, disabled, onChange }: RateFieldProps) {
  const reading = readRate(text);
  const isWrong = isChanged && !reading.ok;
  return (
    <div className={styles.rate}>
      <label htmlFor={`rate-${code}`}>1 {code} =</label>
      <Input
        id={`rate-${code}`}
        inputMode="decimal"
        autoComplete="off"
        value={text}
        disabled={disabled}
        status={isWrong ? 'error' : ''}
        suffix={base}
        onChange={(event) => onChange(event.target.value)}
      />
      <span className={styles.quiet}>{isChanged ? 'from today' : dated && `since ${formatDay(dated)}`}</span>
      {isWrong && <FieldMessage>{reading.message}</FieldMessage>}
      {isWrong && <PlainRates text={text} onChange={onChange} />}
    </div>
  );
}

/** How a rate that can be misread may be meant, each taken with one click. */
function PlainRates({ text, onChange }: Pick<RateFieldProps, 'text' | 'onChange'>) {
  const meant = plainNumbers(text).filter((number) => readRate(number).ok);
  return (
    <div className={styles.meant}>
      {meant.map((number) => (
        <Button key={number} size="small" onClick={() => onChange(number)}>
          Take it as {number}
        </Button>
      ))}
    </div>
  );
}

/** A rate without the zeros that say nothing. */
function shortRate(rate: string): string {
  return rate.includes('.') ? rate.replace(/\.?0+$/, '') : rate;
}
