import { useMutation, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { askAgain, type Duplicate, keepBoth } from '../../../api/parts';
import { detailOf } from '../../../api/problem';

const SECONDS_TO_UNDO = 12;

/** Remembers that both parts of a pair are kept, and offers to take it back. */
export function useKeepBoth({ one, other }: Duplicate) {
  const queryClient = useQueryClient();
  const { notification } = App.useApp();
  const pair = { oneId: one.id, otherId: other.id };
  const key = `kept ${one.id} ${other.id}`;
  const undo = async () => {
    notification.destroy(key);
    try {
      await askAgain(pair);
      await queryClient.invalidateQueries();
    } catch (error) {
      notification.error({ title: 'This can’t be taken back', description: detailOf(error) });
    }
  };
  return useMutation({
    mutationFn: () => keepBoth(pair),
    onSuccess: () => {
      notification.open({
        key,
        title: `${one.partNumber} and ${other.partNumber} are both kept`,
        duration: SECONDS_TO_UNDO,
        placement: 'bottomRight',
        actions: <Button onClick={() => void undo()}>Undo</Button>,
      });
      void queryClient.invalidateQueries();
    },
  });
}
