import { MOST_OFFERS_SAVED } from '@roothertz/common/prices';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { useCallback } from 'react';
import { confirmOffers, undoConfirmation } from '../../api/prices';
import { detailOf } from '../../api/problem';
import { isConfirmable } from './confirmable';
import type { ShownRow } from './draft/shownRows';

const KEY = 'confirmed';
const SECONDS_TO_UNDO = 12;

/** Confirms offers as still valid at once and offers to take that back. */
export function useConfirmPrices() {
  const queryClient = useQueryClient();
  const { notification } = App.useApp();
  const fail = (title: string) => (error: Error) =>
    notification.error({ title, description: detailOf(error), placement: 'bottomRight' });
  const undo = useMutation({
    mutationFn: undoConfirmation,
    onSuccess: () => notification.destroy(KEY),
    onError: fail('The confirmation can’t be taken back'),
    onSettled: () => queryClient.invalidateQueries(),
  });
  const { mutate, isPending } = useMutation({
    mutationFn: confirmOffers,
    onSuccess: (offers) => {
      const ids = offers.map(({ id }) => id);
      notification.open({
        key: KEY,
        title: `${offers.length} ${offers.length === 1 ? 'offer is' : 'offers are'} confirmed as still valid`,
        duration: SECONDS_TO_UNDO,
        placement: 'bottomRight',
        actions: <Button onClick={() => undo.mutate(ids)}>Undo</Button>,
      });
    },
    onError: fail('Nothing is confirmed'),
    onSettled: () => queryClient.invalidateQueries(),
  });
  const confirm = useCallback(
    (rows: readonly ShownRow[]) => {
      const ids = rows.filter(isConfirmable).map(({ offer }) => offer!.id);
      if (ids.length > 0 && ids.length <= MOST_OFFERS_SAVED) mutate(ids);
    },
    [mutate],
  );
  return { confirm, isPending };
}
