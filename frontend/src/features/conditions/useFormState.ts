import {
  CONDITION_FIELDS,
  RESISTOR_CONDITION_FIELDS,
  type RankingRequest,
} from '@roothertz/common/conditions';
import { STAGE_SEARCH_FIELDS } from '@roothertz/common/noise';
import type { FieldError, QuantityField } from '@roothertz/common/parts';
import { useCallback, useMemo, useState } from 'react';
import type { ConditionsForm } from './ConditionsContext';

interface FormSource {
  request: RankingRequest;
  problems: { blocking: readonly FieldError[]; messages: ReadonlyMap<string, string> };
  change: ConditionsForm['change'];
  replace: ConditionsForm['replace'];
}

/** The fields' common state: what is wrong where, and what keeps the conditions from being ranked. */
export function useFormState(
  { request, problems, change, replace }: FormSource,
  refused: readonly FieldError[],
) {
  const [drafts, setDrafts] = useState<ReadonlyMap<string, string>>(new Map());
  const reportDraft = useCallback((path: string, message: string | null) => {
    setDrafts((current) => withDraft(current, path, message));
  }, []);
  const form = useMemo<ConditionsForm>(() => {
    const messages = new Map([...problems.messages, ...refused.map(entryOf)]);
    return { request, messages, change, replace, reportDraft };
  }, [request, problems, refused, change, replace, reportDraft]);
  const blockingField = [...drafts.keys()][0] ?? problems.blocking[0]?.field ?? null;
  return { form, blockedBy: blockingField === null ? null : labelOf(blockingField) };
}

function withDraft(drafts: ReadonlyMap<string, string>, path: string, message: string | null) {
  if (message === null && !drafts.has(path)) return drafts;
  const next = new Map(drafts);
  if (message === null) next.delete(path);
  else next.set(path, message);
  return next;
}

function entryOf({ field, message }: FieldError): [string, string] {
  return [field, message];
}

const FIELDS: Record<string, QuantityField> = {
  ...RESISTOR_CONDITION_FIELDS,
  ...STAGE_SEARCH_FIELDS,
  ...CONDITION_FIELDS,
};

function labelOf(field: string): string {
  return FIELDS[field]?.label ?? field;
}
