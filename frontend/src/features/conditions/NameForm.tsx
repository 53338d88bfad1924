import { Button, Input } from 'antd';
import { useState, type FormEvent } from 'react';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './NamedConditionsBar.module.css';
import { namedProblem } from './namedProblem';

interface NameFormProps {
  name: string;
  verb: string;
  onSubmit: (name: string) => Promise<void>;
  onCancel: () => void;
}

const LONGEST = 100;

/** Asks for a name where it will stand; Escape leaves all as it was. */
export function NameForm({ name: initial, verb, onSubmit, onCancel }: NameFormProps) {
  const [name, setName] = useState(initial);
  const [message, setMessage] = useState<string | null>(null);
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (name.trim() === '') return setMessage('A name was expected, such as “River geophone”.');
    await onSubmit(name.trim()).catch((error: unknown) => setMessage(namedProblem(error)));
  };
  return (
    <form
      className={styles.form}
      onSubmit={(event) => void submit(event)}
      onKeyDown={(event) => event.key === 'Escape' && onCancel()}
    >
      <Input
        autoFocus
        size="small"
        aria-label="Name of the conditions"
        maxLength={LONGEST}
        value={name}
        status={message ? 'error' : ''}
        onFocus={(event) => event.target.select()}
        onChange={(event) => setName(event.target.value)}
      />
      <Button size="small" type="primary" htmlType="submit">
        {verb}
      </Button>
      <Button size="small" onClick={onCancel}>
        Cancel
      </Button>
      {message && <FieldMessage>{message}</FieldMessage>}
    </form>
  );
}
