import { useMemo, useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { LeaveQuestion } from '../../components/LeaveQuestion';
import type { KindOfPart } from './kindOfPart';
import { emptyDraft } from './partDraft';
import { PartForm } from './PartForm';
import { refusalOf } from './refusal';
import { useCreatePart } from './useCreatePart';
import { useLeaveGuard } from '../../components/useLeaveGuard';

export function CreatePart({ kind }: { kind: KindOfPart }) {
  const navigate = useNavigate();
  const [initial] = useState(() => emptyDraft(kind.catalogue));
  const { blocker, markDirty, release } = useLeaveGuard();
  const { mutate, isPending, error } = useCreatePart(kind, (id) => {
    release();
    void navigate(`${kind.path}/${id}`, { replace: true });
  });
  const refusal = useMemo(() => refusalOf(error), [error]);
  return (
    <>
      <LeaveQuestion blocker={blocker} />
      <PartForm
        kind={kind}
        initial={initial}
        saveLabel="Add to your library"
        isSaving={isPending}
        refusal={refusal}
        onSave={mutate}
        onChange={markDirty}
      >
        <Link to={kind.path}>Don’t add</Link>
      </PartForm>
    </>
  );
}
