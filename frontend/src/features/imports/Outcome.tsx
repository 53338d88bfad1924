import { Button } from 'antd';
import { Link } from 'react-router-dom';
import { type Import, isRunning, refusedRowsAddress } from '../../api/imports';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { DiscardButton } from './DiscardButton';
import { moment } from '../../components/moments';
import { grouped } from '../../components/countOf';
import { acceptedRows, isApplicable, isMappable, rows } from './importWords';
import { KINDS } from './kinds';
import styles from './Outcome.module.css';
import type { useImportActs } from './useImportActs';

interface OutcomeProps {
  imported: Import;
  acts: ReturnType<typeof useImportActs>;
  mayEdit: boolean;
  isStale: boolean;
}

/** What can be done with the checked rows, or what became of them. */
export function Outcome({ imported, acts, mayEdit, isStale }: OutcomeProps) {
  const { id, counts } = imported;
  const error = acts.apply.error ?? acts.undo.error ?? acts.cancel.error ?? acts.discard.error;
  if (isRunning(imported)) return error && <FieldMessage>{detailOf(error)}</FieldMessage>;
  return (
    <footer className={styles.outcome}>
      {mayEdit && counts && <NextAct imported={imported} acts={acts} isStale={isStale} />}
      {counts && counts.refused > 0 && (
        <Button href={refusedRowsAddress(id)} download disabled={isStale}>
          Download the {grouped(counts.refused)} refused {counts.refused === 1 ? 'row' : 'rows'}
        </Button>
      )}
      {mayEdit && isMappable(imported) && <DiscardButton discard={acts.discard} />}
      {counts && (
        <p className={styles.words}>
          <OutcomeWords imported={imported} />
        </p>
      )}
      {error && <FieldMessage>{detailOf(error)}</FieldMessage>}
    </footer>
  );
}

function NextAct({ imported, acts: { apply, undo }, isStale }: Omit<OutcomeProps, 'mayEdit'>) {
  const accepted = acceptedRows(imported.counts!);
  if (imported.state === 'applied')
    return (
      <Button onClick={() => undo.mutate()} loading={undo.isPending}>
        Undo this import
      </Button>
    );
  if (!isApplicable(imported)) return null;
  const again = imported.state === 'interrupted' || imported.state === 'failed' ? ' again' : '';
  return (
    <Button
      type="primary"
      disabled={isStale || accepted === 0}
      loading={apply.isPending}
      onClick={() => apply.mutate()}
    >
      Apply {rows(accepted)}
      {again}
    </Button>
  );
}

function OutcomeWords({ imported }: { imported: Import }) {
  const { state, kind, counts, keptCount, appliedAt, appliedBy, undoneAt, undoneBy } = imported;
  const who = (member: typeof appliedBy) => member?.name ?? 'a former member';
  if (state === 'applied')
    return (
      <>
        {rows(acceptedRows(counts!))} applied by {who(appliedBy)}, {moment(appliedAt!)}.{' '}
        <Link to={KINDS[kind].path}>See the {KINDS[kind].title.toLowerCase()}</Link>. Undoing brings back what
        stood there before; {KINDS[kind].stays} stay.
      </>
    );
  if (state === 'undone')
    return (
      `Undone by ${who(undoneBy)}, ${moment(undoneAt!)}. ` +
      (keptCount === 0
        ? `Now ${KINDS[kind].asBefore}.`
        : `${rows(keptCount)} stay as they are: they are listed under “kept”, being ${KINDS[kind].stays}.`)
    );
  if (acceptedRows(counts!) === 0)
    return `There is nothing to apply: no row adds or changes ${KINDS[kind].row}.`;
  return 'Nothing has changed yet. It can be undone afterwards.';
}
