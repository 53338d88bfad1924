import { Button, Input } from 'antd';
import { useState } from 'react';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useMember } from '../../components/useMember';
import styles from './Team.module.css';
import { useRenameTeam } from './useTeamActs';

/** The team's name as the page's heading, which an admin changes in its place. */
export function TeamName({ mayRename }: { mayRename: boolean }) {
  const { name } = useMember().team;
  const [isOpen, setIsOpen] = useState(false);
  if (isOpen) return <RenameForm name={name} onDone={() => setIsOpen(false)} />;
  return (
    <div className={styles.name}>
      <h1>{name}</h1>
      {mayRename && (
        <Button type="link" size="small" onClick={() => setIsOpen(true)}>
          Rename
        </Button>
      )}
    </div>
  );
}

function RenameForm({ name, onDone }: { name: string; onDone: () => void }) {
  const [draft, setDraft] = useState(name);
  const rename = useRenameTeam();
  const isEmpty = draft.trim() === '';
  const save = () => rename.mutate(draft.trim(), { onSuccess: onDone });
  return (
    <form
      className={styles.rename}
      onSubmit={(event) => {
        event.preventDefault();
        if (!isEmpty) save();
      }}
      onKeyDown={(event) => event.key === 'Escape' && onDone()}
    >
      <Input
        aria-label="Name of the team"
        autoFocus
        maxLength={120}
        status={isEmpty ? 'error' : ''}
        value={draft}
        onChange={(event) => setDraft(event.target.value)}
      />
      <Button type="primary" htmlType="submit" disabled={isEmpty} loading={rename.isPending}>
        Save
      </Button>
      <Button onClick={onDone}>Cancel</Button>
      {rename.error && <FieldMessage>{detailOf(rename.error)}</FieldMessage>}
    </form>
  );
}
