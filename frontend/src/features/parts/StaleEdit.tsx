import { Button, Radio } from 'antd';
import { useState } from 'react';
import { chosen, mergeDrafts, type Choice, type Conflict } from './conflicts';
import type { PartDraft } from './partDraft';
import styles from './StaleEdit.module.css';

interface StaleEditProps {
  conflicts: readonly Conflict[];
  mine: PartDraft;
  theirs: PartDraft;
  onResolve: (draft: PartDraft) => void;
}

/** What somebody else changed while this part was edited, and the choice between the two. */
export function StaleEdit({ conflicts, mine, theirs, onResolve }: StaleEditProps) {
  const [choices, setChoices] = useState<Record<string, Choice>>({});
  const resolve = () => onResolve(mergeDrafts(mine, theirs, conflicts, choices));
  return (
    <section className={styles.panel} role="alertdialog" aria-label="The part was changed meanwhile">
      <h2>Somebody else changed this part meanwhile</h2>
      {conflicts.length === 0 ? (
        <p>Their changes don’t touch yours. Save again to keep both.</p>
      ) : (
        <p>Nothing is lost: choose for each value, then save.</p>
      )}
      <ul className={styles.list}>
        {conflicts.map((conflict) => (
          <ConflictRow
            key={conflict.path.join('.')}
            conflict={conflict}
            choice={chosen(conflict, choices)}
            onChoose={(choice) => setChoices({ ...choices, [conflict.path.join('.')]: choice })}
          />
        ))}
      </ul>
      <Button type="primary" onClick={resolve} autoFocus>
        Save with these values
      </Button>
    </section>
  );
}

interface ConflictRowProps {
  conflict: Conflict;
  choice: Choice;
  onChoose: (choice: Choice) => void;
}

function ConflictRow({ conflict, choice, onChoose }: ConflictRowProps) {
  const { path, label, before, mine, theirs } = conflict;
  return (
    <li className={styles.row}>
      <span>
        {label} <span className={styles.before}>was {before}</span>
      </span>
      <Radio.Group
        aria-label={label}
        name={path.join('.')}
        value={choice}
        onChange={(event) => onChoose(event.target.value as Choice)}
        options={[
          { value: 'mine', label: `Keep mine: ${mine}` },
          { value: 'theirs', label: `Take theirs: ${theirs}` },
        ]}
      />
    </li>
  );
}
