import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { opAmpKeys, opAmpQuery, updateOpAmp, type OpAmp } from '../../api/opAmps';
import { ApiProblem } from '../../api/problem';
import { findConflicts, type Conflict } from './conflicts';
import { draftOf, partOf, type PartDraft } from './partDraft';

/** What an edit stands on: the stored part that it changes, and the draft that the form begins with. */
interface Edit {
  base: OpAmp;
  draft: PartDraft;
}

interface Stale {
  conflicts: Conflict[];
  mine: PartDraft;
  theirs: OpAmp;
}

/** Saving an edit of a part that others may have changed since it began. */
export function useEditPart(part: OpAmp, onSaved: () => void) {
  const queryClient = useQueryClient();
  const [edit, setEdit] = useState<Edit>(() => ({ base: part, draft: draftOf(part) }));
  const [stale, setStale] = useState<Stale | null>(null);
  const mutation = useMutation({
    mutationFn: ({ base, draft }: Edit) => updateOpAmp(base.id, base.version, partOf(draft)),
    onSuccess: (saved) => {
      queryClient.setQueryData(opAmpKeys.one(saved.id), saved);
      void queryClient.invalidateQueries();
      onSaved();
    },
    onError: async (error, { base, draft: mine }) => {
      if (!isStale(error)) return;
      const theirs = await queryClient.fetchQuery({ ...opAmpQuery(base.id), staleTime: 0 });
      setStale({ conflicts: findConflicts(draftOf(base), mine, draftOf(theirs)), mine, theirs });
    },
  });
  const resolve = (draft: PartDraft) => {
    const next = { base: stale?.theirs ?? edit.base, draft };
    setStale(null);
    setEdit(next);
    mutation.mutate(next);
  };
  return {
    edit,
    stale,
    isSaving: mutation.isPending,
    error: isStale(mutation.error) ? null : mutation.error,
    save: (draft: PartDraft) => mutation.mutate({ base: edit.base, draft }),
    resolve,
  };
}

function isStale(error: Error | null): boolean {
  return error instanceof ApiProblem && error.code === 'part.stale';
}
