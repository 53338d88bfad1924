import { useMutation, useQueryClient } from '@tanstack/react-query';
import { App } from 'antd';
import { savePrices } from '../../api/prices';
import { ApiProblem, detailOf } from '../../api/problem';
import { savedRefusals, type SentRow } from './draft/savedRefusals';
import type { PriceDraft } from './usePriceDraft';

/** Saves all changes at once or none; what the server refuses comes back to the cells that it is about. */
export function useSavePrices({ refuse, saved }: PriceDraft) {
  const queryClient = useQueryClient();
  const { notification } = App.useApp();
  return useMutation({
    mutationFn: (rows: readonly SentRow[]) => savePrices(rows.map(({ body }) => body)),
    onSuccess: async (offers) => {
      await queryClient.invalidateQueries();
      saved();
      notification.success({
        title: `${offers.length} ${offers.length === 1 ? 'offer is' : 'offers are'} saved`,
        placement: 'bottomRight',
      });
    },
    onError: async (error, rows) => {
      if (error instanceof ApiProblem) refuse(savedRefusals(rows, error));
      notification.error({
        title: 'Nothing is saved, nothing is lost',
        description: detailOf(error),
        placement: 'bottomRight',
      });
      await queryClient.invalidateQueries({ queryKey: ['prices'] });
    },
  });
}
