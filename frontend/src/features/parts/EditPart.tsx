import { useMemo } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';
import type { KindOfPart } from './kindOfPart';
import { LeaveQuestion } from '../../components/LeaveQuestion';
import { draftOf } from './partDraft';
import { PartForm } from './PartForm';
import { refusalOf } from './refusal';
import { StaleEdit } from './StaleEdit';
import { useEditPart } from './useEditPart';
import { useLeaveGuard } from '../../components/useLeaveGuard';

export function EditPart({ kind, part }: { kind: KindOfPart; part: StoredPart }) {
  const navigate = useNavigate();
  const address = `${kind.path}/${part.id}`;
  const { blocker, markDirty, release } = useLeaveGuard();
  const { edit, stale, isSaving, error, save, resolve } = useEditPart(kind, part, () => {
    release();
    void navigate(address, { replace: true });
  });
  const refusal = useMemo(() => refusalOf(error), [error]);
  return (
    <>
      <LeaveQuestion blocker={blocker} />
      {stale ? (
        <StaleEdit
          conflicts={stale.conflicts}
          mine={stale.mine}
          theirs={draftOf(kind.catalogue, stale.theirs)}
          onResolve={resolve}
        />
      ) : (
        <PartForm
          key={edit.base.version}
          kind={kind}
          initial={edit.draft}
          saveLabel="Save"
          isSaving={isSaving}
          refusal={refusal}
          onSave={save}
          onChange={markDirty}
        >
          <Link to={address}>Don’t save</Link>
        </PartForm>
      )}
    </>
  );
}
