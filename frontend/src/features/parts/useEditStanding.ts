import type { CellEditRequestEvent } from 'ag-grid-community';
import { App } from 'antd';
import { useMemo } from 'react';
import type { StoredPart } from '../../api/parts';
import type { KindOfPart } from './kindOfPart';
import { refusedWords } from './standing/refusedWords';
import { planStanding } from './standing/standingPlan';
import { useChangeStandings } from './standing/useChangeStandings';

/** Lifecycle and approval are edited in their cells: Enter or a click opens the choice. */
export function useEditStanding(kind: KindOfPart) {
  const { mutate } = useChangeStandings(kind);
  const { notification } = App.useApp();
  return useMemo(
    () => ({
      readOnlyEdit: true,
      onCellEditRequest: ({ data, colDef, newValue }: CellEditRequestEvent<StoredPart>) => {
        const plan = planStanding([data], { [colDef.colId!]: newValue as string });
        if (plan.changed.length === 0) return;
        mutate(plan, {
          onError: (error) =>
            notification.error({
              title: `${data.partNumber} stays as it is`,
              description: refusedWords(error),
            }),
        });
      },
    }),
    [mutate, notification],
  );
}
