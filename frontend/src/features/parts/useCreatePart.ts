import { useMutation, useQueryClient } from '@tanstack/react-query';
import { partKey } from '../../api/parts';
import type { KindOfPart } from './kindOfPart';

/** Adding a part to the team's own library. */
export function useCreatePart({ create, reader }: KindOfPart, onCreated: (id: string) => void) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: create,
    onSuccess: (part) => {
      queryClient.setQueryData(partKey(reader, part.id), part);
      void queryClient.invalidateQueries();
      onCreated(part.id);
    },
  });
}
