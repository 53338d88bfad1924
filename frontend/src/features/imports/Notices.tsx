import { Button } from 'antd';
import { Link } from 'react-router-dom';
import { type Import, isRunning } from '../../api/imports';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { moment } from '../../components/moments';
import { isMappable, stateWords } from './importWords';
import { KINDS } from './kinds';
import type { ImportMapping } from './useMapping';

interface NoticesProps {
  imported: Import;
  mapping: ImportMapping;
  mayEdit: boolean;
}

/** What one must know of the import before anything else: how the last work ended, the same file before, refusals. */
export function Notices({ imported, mapping, mayEdit }: NoticesProps) {
  const { state, failure, sameFile } = imported;
  const needsCheck = isMappable(imported) && (imported.counts === null || state === 'outdated');
  const canCheck = mayEdit && needsCheck && mapping.errors.length === 0 && !mapping.isPending;
  return (
    <>
      {failure !== null && !isRunning(imported) && <p role="alert">{failure}</p>}
      {state === 'cancelled' && <p role="status">Cancelled: {KINDS[imported.kind].asBefore}.</p>}
      {sameFile !== null && (
        <p>
          The very same file was{' '}
          <Link to={`/imports/${sameFile.id}`}>read on {moment(sameFile.createdAt)}</Link>:{' '}
          {stateWords(sameFile.state)}.
        </p>
      )}
      {mapping.error && <FieldMessage>{detailOf(mapping.error)}</FieldMessage>}
      {canCheck && imported.mapping !== null && <Button onClick={mapping.checkAgain}>Check the rows</Button>}
    </>
  );
}
