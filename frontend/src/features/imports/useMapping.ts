import type { WholeList } from '@roothertz/common/imports';
import { useMutation, type UseMutationResult, useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useRef, useState } from 'react';
import { type DialectChoice, type Import, importKey } from '../../api/imports';
import { ApiProblem } from '../../api/problem';
import { useDebounced } from '../../components/useDebounced';
import { isDescribable } from './importWords';
import { KINDS } from './kinds';
import type { Mapping } from './mappingDraft';
import { readAnew } from './readAnew';
import { isKept, type Said, startingSaid, tell } from './said';
import { useTakeImport } from './useImport';

const PAUSE_MS = 500;

/** What is said of the list, as it stands on the page; each change of it has the rows checked again. */
export function useMapping(imported: Import, mayEdit: boolean) {
  const { kind, columns } = imported;
  const [draft, setDraft] = useState<Said | null>(null);
  const starting = useMemo(() => startingSaid(imported), [imported]);
  const said = draft ?? starting;
  const errors = useMemo(
    () => KINDS[kind].view.columns.check(said.mapping, columns.length, said.wholeList),
    [kind, said, columns],
  );
  const { check, overrule } = useTelling(imported, said, draft, setDraft);
  const isPending = check.isPending || overrule.isPending;
  useAutomaticCheck({ imported, said, isOff: !mayEdit || errors.length > 0 || isPending }, check);
  return {
    mapping: said.mapping,
    wholeList: said.wholeList,
    errors,
    isStale: isPending || imported.counts === null || !isKept(said, imported),
    isPending,
    error: overrule.error ?? check.error,
    change: (mapping: Mapping) => setDraft({ ...said, mapping }),
    changeWholeList: (wholeList: WholeList) => setDraft({ ...said, wholeList }),
    overrule: overrule.mutate,
    checkAgain: () => check.mutate(said),
  };
}

export type ImportMapping = ReturnType<typeof useMapping>;

/** Sends what is said, one after the other; where another member was quicker, theirs stands. */
function useTelling(
  imported: Import,
  said: Said,
  draft: Said | null,
  setDraft: React.Dispatch<React.SetStateAction<Said | null>>,
) {
  const { id } = imported;
  const versionRef = useBaseVersionRef(imported, draft);
  const take = useTakeImport();
  const queryClient = useQueryClient();
  const options = {
    scope: { id: `mapping of import ${id}` },
    onError: (error: Error) => {
      if (!(error instanceof ApiProblem) || error.code !== 'import.stale') return;
      setDraft(null);
      void queryClient.invalidateQueries({ queryKey: importKey(id) });
    },
  };
  const check = useMutation({
    ...options,
    mutationFn: (sent: Said) => tell(imported, sent, versionRef.current),
    onSuccess: (answered, sent) => {
      versionRef.current = answered.version;
      take(answered);
      setDraft((standing) => (standing === sent ? null : standing));
    },
  });
  const overrule = useMutation({
    ...options,
    mutationFn: (choice: DialectChoice) => readAnew(imported, said, choice, versionRef.current),
    onSuccess: ({ answered, unsent }) => {
      versionRef.current = answered.version;
      take(answered);
      setDraft(unsent);
    },
  });
  return { check, overrule };
}

/** The version on which the next thing said is based: what others say while a draft stands doesn't count for it. */
function useBaseVersionRef({ version }: Import, draft: Said | null) {
  const baseRef = useRef(version);
  useEffect(() => {
    if (draft === null) baseRef.current = Math.max(baseRef.current, version);
  }, [draft, version]);
  return baseRef;
}

interface Standing {
  imported: Import;
  said: Said;
  isOff: boolean;
}

/** Checks the rows once something that the server doesn't have has stood for a moment; a running check is stopped by that. */
function useAutomaticCheck(
  { imported, said, isOff }: Standing,
  check: UseMutationResult<Import, Error, Said>,
): void {
  const settled = useDebounced(said, PAUSE_MS);
  const isDue = !isOff && settled === said && !isKept(said, imported) && isDescribable(imported);
  const isNew = check.variables !== said;
  const { mutate } = check;
  useEffect(() => {
    if (isDue && isNew) mutate(said);
  }, [isDue, isNew, mutate, said]);
}
