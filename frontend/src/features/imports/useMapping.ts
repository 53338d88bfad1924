import { checkMapping } from '@roothertz/common/imports';
import { useMutation, type UseMutationResult } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';
import { cancelImport, type DialectChoice, type Import, mapImport } from '../../api/imports';
import { useDebounced } from '../../components/useDebounced';
import { isMappable } from './importWords';
import { KINDS } from './kinds';
import { type Mapping, sameMapping, startingMapping } from './mappingDraft';
import { readAnew } from './readAnew';
import { useTakeImport } from './useImport';

const PAUSE_MS = 500;

/** What the columns are, as it stands on the page; each change of it has the rows checked again. */
export function useMapping(imported: Import, mayEdit: boolean) {
  const { id, kind, columns } = imported;
  const take = useTakeImport();
  const [draft, setDraft] = useState<Mapping | null>(null);
  const mapping = useStanding(imported, draft);
  const errors = useMemo(
    () => checkMapping(KINDS[kind].catalogue, mapping, columns.length),
    [kind, mapping, columns],
  );
  const scope = { id: `mapping of import ${id}` };
  const check = useMutation({
    scope,
    mutationFn: (sent: Mapping) => mapImport(id, { columns: [...sent] }),
    onSuccess: (answered, sent) => {
      take(answered);
      setDraft((standing) => (standing === sent ? null : standing));
    },
  });
  const overrule = useMutation({
    scope,
    mutationFn: (choice: DialectChoice) => readAnew(imported, mapping, choice),
    onSuccess: ({ answered, unsent }) => {
      take(answered);
      setDraft(unsent);
    },
  });
  const isPending = check.isPending || overrule.isPending;
  useAutomaticCheck({ imported, mapping, isOff: !mayEdit || errors.length > 0 || isPending }, check);
  return {
    mapping,
    errors,
    isStale: isPending || imported.counts === null || !sameMapping(mapping, imported.mapping),
    isPending,
    error: overrule.error ?? check.error,
    change: setDraft,
    overrule: overrule.mutate,
    checkAgain: () => check.mutate(mapping),
  };
}

export type ImportMapping = ReturnType<typeof useMapping>;

function useStanding({ mapping, rememberedMapping, columns }: Import, draft: Mapping | null): Mapping {
  return useMemo(
    () => draft ?? startingMapping({ mapping, rememberedMapping, columns }),
    [draft, mapping, rememberedMapping, columns],
  );
}

interface Standing {
  imported: Import;
  mapping: Mapping;
  isOff: boolean;
}

/** Checks the rows once a mapping that the server doesn't have has stood for a moment; a running check is stopped first. */
function useAutomaticCheck(
  { imported, mapping, isOff }: Standing,
  check: UseMutationResult<Import, Error, Mapping>,
): void {
  const settled = useDebounced(mapping, PAUSE_MS);
  const take = useTakeImport();
  const stop = useMutation({ mutationFn: cancelImport, onSuccess: take });
  const isDue = !isOff && settled === mapping && !sameMapping(mapping, imported.mapping);
  const canCheck = isDue && isMappable(imported) && check.variables !== mapping;
  const mustStop = isDue && imported.state === 'checking';
  const [{ mutate: checkNow }, { mutate: stopNow }, id] = [check, stop, imported.id];
  useEffect(() => {
    if (canCheck) checkNow(mapping);
  }, [canCheck, checkNow, mapping]);
  useEffect(() => {
    if (mustStop) stopNow(id);
  }, [mustStop, stopNow, id]);
}
