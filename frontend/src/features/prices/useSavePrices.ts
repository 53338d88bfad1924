import { type InfiniteData, useMutation, useQueryClient } from '@tanstack/react-query';
import { App } from 'antd';
import {
  partOffersQuery,
  PRICE_LISTS_KEY,
  type PriceListPage,
  PRICES_KEY,
  savePrices,
} from '../../api/prices';
import { ApiProblem, detailOf } from '../../api/problem';
import type { Overrun } from './draft/draft';
import { overrunOf } from './draft/overruns';
import { overrunRows, savedRefusals, type SentRow } from './draft/savedRefusals';
import { withSaved } from './savedRows';
import type { PriceDraft } from './usePriceDraft';

/** Saves all changes at once or none; what the server refuses comes back to the cells that it is about. */
export function useSavePrices({ refuse, saved }: PriceDraft) {
  const queryClient = useQueryClient();
  const { notification } = App.useApp();
  const findOverruns = useFindOverruns();
  return useMutation({
    mutationFn: (rows: readonly SentRow[]) => savePrices(rows.map(({ body }) => body)),
    onSuccess: (offers, rows) => {
      queryClient.setQueriesData<InfiniteData<PriceListPage>>(
        { queryKey: PRICE_LISTS_KEY },
        (list) => list && { ...list, pages: withSaved(list.pages, rows, offers) },
      );
      saved();
      void queryClient.invalidateQueries();
      notification.success({
        title: `${offers.length} ${offers.length === 1 ? 'offer is' : 'offers are'} saved`,
        placement: 'bottomRight',
      });
    },
    onError: async (error, rows) => {
      notification.error({
        title: 'Nothing is saved, nothing is lost',
        description: detailOf(error),
        placement: 'topRight',
      });
      if (error instanceof ApiProblem) {
        const overruns = await findOverruns(rows, error);
        const told = savedRefusals(rows, error).filter(
          ({ key, column }) => column !== 'part' || !overruns.has(key),
        );
        refuse(told, overruns);
      }
      void queryClient.invalidateQueries({ queryKey: PRICES_KEY });
    },
  });
}

/** Asks what became of the offers that somebody else has changed; what can't be told stays a refusal. */
function useFindOverruns() {
  const queryClient = useQueryClient();
  return async (rows: readonly SentRow[], problem: ApiProblem): Promise<Map<string, Overrun>> => {
    const found = await Promise.all(
      overrunRows(rows, problem).map(async ({ key, part, offer }) => {
        const query = { ...partOffersQuery(part.id), staleTime: 0, retry: false };
        const offers = await queryClient.fetchQuery(query).catch(() => null);
        const overrun = offers && offer && overrunOf(offer.id, offers);
        return overrun ? ([[key, overrun]] as const) : [];
      }),
    );
    return new Map(found.flat());
  };
}
