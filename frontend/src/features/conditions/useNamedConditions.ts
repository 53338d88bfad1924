import type { RankingRequest } from '@roothertz/common/conditions';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import {
  createConditions,
  deleteConditions,
  NAMED_CONDITIONS_KEY,
  namedConditionsQuery,
  updateConditions,
  type NamedConditions,
} from '../../api/conditions';
import { sameRequest } from './sameRequest';

export type NamedState = 'unnamed' | 'saved' | 'changed';

/** The team's named conditions, which of them is shown, and what can be done with it. */
export function useNamedConditions(namedId: string | null, request: RankingRequest) {
  const { data: all } = useQuery(namedConditionsQuery);
  const current = all?.find(({ id }) => id === namedId) ?? null;
  return { all: all ?? [], current, state: stateOf(current, request), ...useNamedMutations() };
}

function stateOf(current: NamedConditions | null, request: RankingRequest): NamedState {
  if (current === null) return 'unnamed';
  return sameRequest(current, request) ? 'saved' : 'changed';
}

function useNamedMutations() {
  const queryClient = useQueryClient();
  const reload = () => queryClient.invalidateQueries({ queryKey: NAMED_CONDITIONS_KEY });
  const onSettled = reload;
  const create = useMutation({
    mutationFn: ({ name, request }: { name: string; request: RankingRequest }) =>
      createConditions(name, request),
    onSettled,
  });
  const update = useMutation({
    mutationFn: ({ named, changes }: UpdateVariables) => updateConditions(named, changes),
    onSettled,
  });
  const remove = useMutation({ mutationFn: deleteConditions, onSettled });
  return { create, update, remove };
}

interface UpdateVariables {
  named: NamedConditions;
  changes: Parameters<typeof updateConditions>[1];
}
