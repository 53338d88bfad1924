import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { PartListFilter, StandingOutcome } from '../../../api/parts';
import { useUndoNotice } from '../../../components/useUndoNotice';
import { countOf } from '../../../components/countOf';
import type { KindOfPart } from '../kindOfPart';
import { refusedWords } from './refusedWords';
import { setWords, type Wanted } from './standingPlan';

interface Said {
  wanted: Wanted;
  outcome: StandingOutcome;
}

/** Changes how all parts of a filter stand, and offers to take it back; whoever looks again sees the outcome anew. */
export function useChangeMatching({ reader }: KindOfPart, filter: PartListFilter) {
  const queryClient = useQueryClient();
  const offerUndo = useUndoNotice();
  return useMutation({
    mutationFn: ({ wanted, outcome: { libraryRevision } }: Said) =>
      reader.changeMatching(filter, { ...wanted, libraryRevision }),
    onSuccess: ({ id, changed }, { wanted }) =>
      offerUndo({
        key: `standings ${id}`,
        title: setWords(wanted, countOf(changed, 'part'), changed),
        undo: async () => {
          const { kept } = await reader.undoMatching(id);
          await queryClient.invalidateQueries();
          return kept === 0 ? undefined : `${countOf(kept, 'part')} changed since and stayed`;
        },
        refused: refusedWords,
      }),
    onSettled: () => void queryClient.invalidateQueries(),
  });
}
