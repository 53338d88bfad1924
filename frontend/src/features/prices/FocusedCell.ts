import { createContext, use } from 'react';

export interface FocusedCell {
  key: string;
  column: string;
}

export const FocusedCellContext = createContext<FocusedCell | null>(null);

/** Whether a cell of the grid has the focus. */
export function useIsFocused(key: string, column: string): boolean {
  const focused = use(FocusedCellContext);
  return focused?.key === key && focused.column === column;
}
