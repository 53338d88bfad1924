import { useMutation } from '@tanstack/react-query';
import { App } from 'antd';
import { detailOf } from '../../api/problem';
import { toGridRow } from './draft/cells';
import type { PastedRectangle } from './useGridKeys';
import type { PriceDraft } from './usePriceDraft';
import type { PriceList } from './usePriceList';

/** Pastes rectangles; rows that one covers and that aren't loaded yet are loaded first. */
export function usePaste({ rows, paste }: PriceDraft, { items, total, loadTo }: PriceList) {
  const { notification } = App.useApp();
  const { mutate, isPending } = useMutation({
    mutationFn: async ({ rowIndex, columns, texts }: PastedRectangle) => {
      const covered = rows.slice(rowIndex);
      const loaded = await loadTo(items.length + texts.length - covered.length);
      const added = loaded.slice(items.length).map(toGridRow);
      paste({ rows: [...covered, ...added], columns }, texts);
    },
    onError: (error) =>
      notification.error({
        title: 'Nothing is pasted: the rows for it can’t be loaded',
        description: detailOf(error),
        placement: 'bottomRight',
      }),
  });
  const pasteHere = (rectangle: PastedRectangle) => {
    const { rowIndex, columns, texts } = rectangle;
    const isCovered = rowIndex + texts.length <= rows.length || items.length >= total;
    if (isCovered) paste({ rows: rows.slice(rowIndex), columns }, texts);
    else mutate(rectangle);
  };
  return { paste: pasteHere, isPending };
}
