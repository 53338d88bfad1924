import { useMutation, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import type { KindOfPart } from '../kindOfPart';
import { refusedWords } from './refusedWords';
import { changesBack, changesOf, doneWords, type StandingPlan } from './standingPlan';

const SECONDS_TO_UNDO = 12;

/** Changes how parts stand, all of them or none, and offers to take it back. */
export function useChangeStandings({ reader }: KindOfPart) {
  const queryClient = useQueryClient();
  const { notification } = App.useApp();
  const undo = async (key: string, back: ReturnType<typeof changesBack>) => {
    notification.destroy(key);
    try {
      await reader.changeStandings(back);
      await queryClient.invalidateQueries();
    } catch (error) {
      notification.error({ title: 'This can’t be taken back', description: refusedWords(error) });
    }
  };
  return useMutation({
    mutationFn: (plan: StandingPlan) => reader.changeStandings(changesOf(plan)),
    onSuccess: ({ items }, plan) => {
      const key = `standing ${items[0].id} ${items[0].version}`;
      notification.open({
        key,
        title: doneWords(plan),
        duration: SECONDS_TO_UNDO,
        placement: 'bottomRight',
        actions: <Button onClick={() => void undo(key, changesBack(plan, items))}>Undo</Button>,
      });
      void queryClient.invalidateQueries();
    },
  });
}
