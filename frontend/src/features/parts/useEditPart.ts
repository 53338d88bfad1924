import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { partKey, partQuery, type StoredPart } from '../../api/parts';
import { ApiProblem } from '../../api/problem';
import { findConflicts, type Conflict } from './conflicts';
import type { KindOfPart } from './kindOfPart';
import { draftOf, type PartDraft } from './partDraft';

/** What an edit stands on: the stored part that it changes, and the draft that the form begins with. */
interface Edit {
  base: StoredPart;
  draft: PartDraft;
}

interface Stale {
  conflicts: Conflict[];
  mine: PartDraft;
  theirs: StoredPart;
}

/** Saving an edit of a part that others may have changed since it began. */
export function useEditPart(kind: KindOfPart, part: StoredPart, onSaved: () => void) {
  const { catalogue, reader, update } = kind;
  const queryClient = useQueryClient();
  const [edit, setEdit] = useState<Edit>(() => ({ base: part, draft: draftOf(catalogue, part) }));
  const [stale, setStale] = useState<Stale | null>(null);
  const mutation = useMutation({
    mutationFn: ({ base, draft }: Edit) => update(base, draft),
    onSuccess: (saved) => {
      queryClient.setQueryData(partKey(reader, saved.id), saved);
      void queryClient.invalidateQueries();
      onSaved();
    },
    onError: async (error, { base, draft: mine }) => {
      if (!isStale(error)) return;
      const theirs = await queryClient.fetchQuery({ ...partQuery(reader, base.id), staleTime: 0 });
      const conflicts = findConflicts(catalogue, draftOf(catalogue, base), mine, draftOf(catalogue, theirs));
      setStale({ conflicts, mine, theirs });
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
