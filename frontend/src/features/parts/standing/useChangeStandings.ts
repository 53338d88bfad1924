import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useUndoNotice } from '../../../components/useUndoNotice';
import type { KindOfPart } from '../kindOfPart';
import { refusedWords } from './refusedWords';
import { changesBack, changesOf, doneWords, type StandingPlan } from './standingPlan';

/** Changes how parts stand, all of them or none, and offers to take it back. */
export function useChangeStandings({ reader }: KindOfPart) {
  const queryClient = useQueryClient();
  const offerUndo = useUndoNotice();
  return useMutation({
    mutationFn: (plan: StandingPlan) => reader.changeStandings(changesOf(plan)),
    onSuccess: ({ items }, plan) => {
      offerUndo({
        key: `standing ${items[0].id} ${items[0].version}`,
        title: doneWords(plan),
        undo: async () => {
          await reader.changeStandings(changesBack(plan, items));
          await queryClient.invalidateQueries();
        },
        refused: refusedWords,
      });
      void queryClient.invalidateQueries();
    },
  });
}
