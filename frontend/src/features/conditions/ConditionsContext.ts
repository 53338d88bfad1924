import type { RankingRequest } from '@roothertz/common/conditions';
import { createContext, use } from 'react';
import type { NextRequest } from './useConditionsAddress';

/** What the fields of the operating conditions share. */
export interface ConditionsForm {
  request: RankingRequest;
  /** What is wrong with a field, by its path. */
  messages: ReadonlyMap<string, string>;
  /** Puts another value at a path; undefined takes it away. */
  change: (path: string, value: unknown) => void;
  replace: (next: NextRequest) => void;
  /** Told of a text in a field that can't be read, and when it is gone. */
  reportDraft: (path: string, message: string | null) => void;
}

export const ConditionsContext = createContext<ConditionsForm | null>(null);

export function useConditionsForm(): ConditionsForm {
  const form = use(ConditionsContext);
  if (!form) throw new Error('A field of the operating conditions stands outside their form.');
  return form;
}
