import { useMemo, useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { LeaveQuestion } from './LeaveQuestion';
import { emptyDraft } from './partDraft';
import { PartForm } from './PartForm';
import { refusalOf } from './refusal';
import { useCreatePart } from './useCreatePart';
import { useLeaveGuard } from './useLeaveGuard';

export function CreatePart() {
  const navigate = useNavigate();
  const [initial] = useState(emptyDraft);
  const { blocker, markDirty, release } = useLeaveGuard();
  const { mutate, isPending, error } = useCreatePart((id) => {
    release();
    void navigate(`/parts/${id}`, { replace: true });
  });
  const refusal = useMemo(() => refusalOf(error), [error]);
  return (
    <>
      <LeaveQuestion blocker={blocker} />
      <PartForm
        initial={initial}
        saveLabel="Add to your library"
        isSaving={isPending}
        refusal={refusal}
        onSave={mutate}
        onChange={markDirty}
      >
        <Link to="/parts">Don’t add</Link>
      </PartForm>
    </>
  );
}
