import { useMemo } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import type { OpAmp } from '../../api/opAmps';
import { LeaveQuestion } from './LeaveQuestion';
import { draftOf } from './partDraft';
import { PartForm } from './PartForm';
import { refusalOf } from './refusal';
import { StaleEdit } from './StaleEdit';
import { useEditPart } from './useEditPart';
import { useLeaveGuard } from './useLeaveGuard';

export function EditPart({ part }: { part: OpAmp }) {
  const navigate = useNavigate();
  const { blocker, markDirty, release } = useLeaveGuard();
  const { edit, stale, isSaving, error, save, resolve } = useEditPart(part, () => {
    release();
    void navigate(`/parts/${part.id}`, { replace: true });
  });
  const refusal = useMemo(() => refusalOf(error), [error]);
  return (
    <>
      <LeaveQuestion blocker={blocker} />
      {stale ? (
        <StaleEdit
          conflicts={stale.conflicts}
          mine={stale.mine}
          theirs={draftOf(stale.theirs)}
          onResolve={resolve}
        />
      ) : (
        <PartForm
          key={edit.base.version}
          initial={edit.draft}
          saveLabel="Save"
          isSaving={isSaving}
          refusal={refusal}
          onSave={save}
          onChange={markDirty}
        >
          <Link to={`/parts/${part.id}`}>Don’t save</Link>
        </PartForm>
      )}
    </>
  );
}
