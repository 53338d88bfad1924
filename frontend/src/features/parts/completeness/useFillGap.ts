import { useMutation, useQueryClient } from '@tanstack/react-query';
import { partKey, type StoredPart } from '../../../api/parts';
import type { KindOfPart } from '../kindOfPart';
import { draftOf, figuresOf } from '../partDraft';

interface Filled {
  part: StoredPart;
  key: string;
  value: number | string | null;
}

interface CachedList {
  items: StoredPart[];
}

/** States what a part lacks. Its row stays where it is, so that the next one can be filled in. */
export function useFillGap({ catalogue, reader, update }: KindOfPart) {
  const queryClient = useQueryClient();
  const lists = [reader.name, 'list'];
  return useMutation({
    mutationFn: ({ part, key, value }: Filled) => {
      const figures = { ...figuresOf(catalogue, part), [key]: value };
      return update(part, { ...draftOf(catalogue, part), [catalogue.group]: figures });
    },
    onSuccess: (saved) => {
      queryClient.setQueryData(partKey(reader, saved.id), saved);
      queryClient.setQueriesData<CachedList>(
        { queryKey: lists },
        (list) => list && { ...list, items: list.items.map((part) => (part.id === saved.id ? saved : part)) },
      );
      void queryClient.invalidateQueries({ queryKey: [reader.name, 'gaps'] });
      void queryClient.invalidateQueries({ queryKey: lists, refetchType: 'none' });
    },
  });
}
