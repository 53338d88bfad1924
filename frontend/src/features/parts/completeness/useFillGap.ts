import { useMutation, useQueryClient } from '@tanstack/react-query';
import { partKey, type StoredPart } from '../../../api/parts';
import { useUndoNotice } from '../../../components/useUndoNotice';
import type { KindOfPart } from '../kindOfPart';
import { draftOf, figuresOf } from '../partDraft';
import { refusedWords } from '../standing/refusedWords';

interface Filled {
  part: StoredPart;
  key: string;
  /** What is filled in, such as `current noise`. */
  label: string;
  value: number | string | null;
}

interface CachedList {
  items: StoredPart[];
}

/** States what a part lacks, and offers to take it back. Its row stays where it is, so that the next one can be filled in. */
export function useFillGap(kind: KindOfPart) {
  const keep = useKeepInList(kind);
  const offerUndo = useUndoNotice();
  return useMutation({
    mutationFn: ({ part, key, value }: Filled) => state(kind, part, key, value),
    onSuccess: (saved, { part, key, label, value }) => {
      keep(saved);
      const before = figuresOf(kind.catalogue, part)[key];
      offerUndo({
        key: `filled ${saved.id} ${saved.version}`,
        title: `${label} of ${part.partNumber} is ${value === null ? 'unknown again' : before === null ? 'stated' : 'changed'}`,
        undo: async () => {
          const now = await kind.reader.find(saved.id, new AbortController().signal);
          if (figuresOf(kind.catalogue, now)[key] !== value) return `${label} was changed since and stays`;
          keep(await state(kind, now, key, before));
        },
        refused: refusedWords,
      });
    },
  });
}

function state(
  { catalogue, update }: KindOfPart,
  part: StoredPart,
  key: string,
  value: number | string | null,
): Promise<StoredPart> {
  const figures = { ...figuresOf(catalogue, part), [key]: value };
  return update(part, { ...draftOf(catalogue, part), [catalogue.group]: figures });
}

function useKeepInList({ reader }: KindOfPart): (saved: StoredPart) => void {
  const queryClient = useQueryClient();
  const lists = [reader.name, 'list'];
  return (saved) => {
    queryClient.setQueryData(partKey(reader, saved.id), saved);
    queryClient.setQueriesData<CachedList>(
      { queryKey: lists },
      (list) => list && { ...list, items: list.items.map((part) => (part.id === saved.id ? saved : part)) },
    );
    void queryClient.invalidateQueries({ queryKey: [reader.name, 'gaps'] });
    void queryClient.invalidateQueries({ queryKey: lists, refetchType: 'none' });
  };
}
