import { Checkbox } from 'antd';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './ConditionList.module.css';
import { useConditionsForm } from './ConditionsContext';
import { valueAt } from './requestPath';

interface FilterChoiceProps<Word extends string> {
  path: string;
  label: string;
  words: readonly Word[];
  names: Record<Word, string>;
}

/** Several words to tick; none ticked excludes nothing, so all count. */
export function FilterChoice<Word extends string>({ path, label, words, names }: FilterChoiceProps<Word>) {
  const { request, messages, change } = useConditionsForm();
  const chosen = (valueAt(request, path) as Word[] | undefined) ?? [];
  const message = messages.get(path);
  const options = words.map((word) => ({ value: word, label: names[word] }));
  return (
    <fieldset className={styles.choiceGroup}>
      <legend className={styles.label}>{label}</legend>
      <Checkbox.Group
        options={options}
        value={chosen}
        onChange={(next) => change(path, inOrder(words, next))}
      />
      {message && <FieldMessage>{message}</FieldMessage>}
    </fieldset>
  );
}

function inOrder<Word extends string>(words: readonly Word[], chosen: readonly Word[]): Word[] {
  return words.filter((word) => chosen.includes(word));
}
