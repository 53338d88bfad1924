import { useMutation, useQueryClient } from '@tanstack/react-query';
import { askAgain, type Duplicate, keepBoth } from '../../../api/parts';
import { detailOf } from '../../../api/problem';
import { useUndoNotice } from '../../../components/useUndoNotice';

/** Remembers that both parts of a pair are kept, and offers to take it back. */
export function useKeepBoth({ one, other }: Duplicate) {
  const queryClient = useQueryClient();
  const offerUndo = useUndoNotice();
  const pair = { oneId: one.id, otherId: other.id };
  return useMutation({
    mutationFn: () => keepBoth(pair),
    onSuccess: () => {
      offerUndo({
        key: `kept ${one.id} ${other.id}`,
        title: `${one.partNumber} and ${other.partNumber} are both kept`,
        undo: async () => {
          await askAgain(pair);
          await queryClient.invalidateQueries();
        },
        refused: detailOf,
      });
      void queryClient.invalidateQueries();
    },
  });
}
