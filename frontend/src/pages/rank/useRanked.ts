import { checkResistorConditions } from '@roothertz/common/conditions';
import { checkStageSearch } from '@roothertz/common/noise';
import type { FieldError } from '@roothertz/common/parts';
import { useMemo } from 'react';
import { resistorRequest, stageRequest } from '../../features/conditions/search/stageSearch';
import type { useSearchAddress } from '../../features/conditions/search/useSearchAddress';
import type { useConditionsAddress } from '../../features/conditions/useConditionsAddress';
import { opAmpAnswer } from '../../features/ranking/opAmpAnswer';
import { resistorAnswer } from '../../features/ranking/resistors/resistorAnswer';
import { useResistors } from '../../features/ranking/resistors/useResistors';
import { stageAnswer } from '../../features/ranking/stages/stageAnswer';
import { useStages } from '../../features/ranking/stages/useStages';
import { useRanking } from '../../features/ranking/useRanking';

export type Address = ReturnType<typeof useConditionsAddress>;
type Search = ReturnType<typeof useSearchAddress>;

/** What the chosen view ranks at the conditions of the address, and what stands in the way of it. */
export function useRanked({ isBlank, request, problems }: Address, search: Search) {
  const { view, stageSearch, place, sort, technologies, tolerance } = search;
  const requests = useMemo(
    () => ({
      stages: stageRequest(request, stageSearch.values, { sort, technologies, tolerance }),
      resistors: resistorRequest(request, place.values, { technologies, tolerance }),
    }),
    [request, stageSearch.values, place.values, sort, technologies, tolerance],
  );
  const blocking = useMemo(() => {
    const { conditions, filter } = requests.stages;
    if (view === 'stages') return checkStageSearch(conditions, filter);
    return view === 'resistors' ? checkResistorConditions(requests.resistors) : problems.blocking;
  }, [view, requests, problems.blocking]);
  const isAsked = !isBlank && blocking.length === 0;
  const hasOpAmps = !isBlank && problems.blocking.length === 0 && view !== 'stages';
  const opAmps = useRanking(request, hasOpAmps);
  const stages = useStages(requests.stages, isAsked && view === 'stages');
  const resistors = useResistors(requests.resistors, isAsked && view === 'resistors');
  const words = useMemo(
    () => ({
      'op-amps': opAmps.ranking && opAmpAnswer(opAmps.ranking),
      stages: stages.stages && stageAnswer(stages.stages),
      resistors: resistors.resistors && resistorAnswer(resistors.resistors),
    }),
    [opAmps.ranking, stages.stages, resistors.resistors],
  );
  const { error } = { 'op-amps': opAmps, stages, resistors }[view];
  return {
    opAmps,
    stages,
    resistors,
    error,
    words: words[view],
    problems: useMemo(
      () => ({ blocking, messages: withErrors(problems.messages, blocking) }),
      [blocking, problems.messages],
    ),
  };
}

export type Ranked = ReturnType<typeof useRanked>;

function withErrors(messages: ReadonlyMap<string, string>, errors: readonly FieldError[]) {
  return new Map([...messages, ...errors.map(({ field, message }): [string, string] => [field, message])]);
}
