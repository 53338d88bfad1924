import { checkConditions, type RankingRequest, type StageConditions } from '@roothertz/common/conditions';
import type { FieldError } from '@roothertz/common/parts';
import { useCallback, useMemo, useRef } from 'react';
import type { Address } from '../../components/useAddress';
import { readAddress } from './address/readAddress';
import { writeAddress } from './address/writeAddress';
import { exampleRequest } from './exampleRequest';
import { valueAt, withValue } from './requestPath';
import { withView } from './search/searchAddress';
import { SEARCH_KEYS, WANTED_KEY, type View } from './search/searchKeys';
import { withNetworkOf } from './search/takenNetwork';
import { keepsNetwork, readWanted, withWanted, withWantedAgain } from './search/wantedGain';

const NAMED_KEY = 'named';
const PART_KEY = 'part';

/** Fields whose text is taken while it is typed: one step back for all of it. */
const TYPED_FIELDS: readonly string[] = ['filter.search', 'filter.package'];

/** Other conditions, or how they follow from those that were asked for last. */
export type NextRequest = RankingRequest | ((before: RankingRequest) => RankingRequest);

/** The conditions of the page's address, and how to change them. */
export function useConditionsAddress({ params, change: changeAddress }: Address) {
  const lastTyped = useRef<{ path: string; value: unknown } | null>(null);
  const content = useMemo(() => readAddress(params), [params]);
  const request = useMemo(() => content?.request ?? exampleRequest('non-inverting'), [content]);
  const problems = useMemo(() => problemsOf(request, content?.errors ?? []), [request, content]);

  const show = useCallback(
    (next: ShownRequest, named: string | null, replace = false) =>
      changeAddress((before) => addressOf(next, named, before), replace),
    [changeAddress],
  );
  const replace = useCallback(
    (next: NextRequest, noStepBack = false) =>
      changeAddress((before) => {
        const after = typeof next === 'function' ? next(requestOf(before)) : next;
        return addressOf(after, before.get(NAMED_KEY), before);
      }, noStepBack),
    [changeAddress],
  );
  const change = useCallback(
    (path: string, value: unknown) => {
      const goesOn = lastTyped.current?.path === path && lastTyped.current.value === valueAt(request, path);
      lastTyped.current = TYPED_FIELDS.includes(path) ? { path, value: value || undefined } : null;
      replace((before) => withValue(before, path, value), goesOn);
    },
    [request, replace],
  );
  const showView = useCallback(
    (view: View) => changeAddress((before) => inView(before, view)),
    [changeAddress],
  );
  /** A found network in the schematic, shown among op-amps: one step back for both. */
  const takeNetwork = useCallback(
    (found: StageConditions) =>
      changeAddress((before) => {
        const asked = requestOf(before);
        const taken = addressOf(withNetworkOf(asked, found), before.get(NAMED_KEY), before);
        return withView(withWanted(taken, asked.conditions.stage, found), 'op-amps');
      }),
    [changeAddress],
  );
  const selectPart = useCallback(
    (id: string) => changeAddress((before) => withPart(before, id), true),
    [changeAddress],
  );
  const namedId = params.get(NAMED_KEY);
  const chosenKey = params.get(PART_KEY);
  return {
    isBlank: content === null,
    request,
    problems,
    namedId,
    /** the chosen part, or one of its stages: then its id stands in front of a full stop */
    chosenKey,
    partId: chosenKey?.split('.')[0] ?? null,
    change,
    replace,
    show,
    showView,
    takeNetwork,
    wanted: readWanted(params, request.conditions.stage),
    selectPart,
  };
}

/** Whole stages are sought for what was wanted, not for what a network that was taken gives. */
function inView(before: URLSearchParams, view: View): URLSearchParams {
  const { stage } = requestOf(before).conditions;
  return withView(view === 'stages' ? withWantedAgain(before, stage) : before, view);
}

function requestOf(params: URLSearchParams): RankingRequest {
  return readAddress(params)?.request ?? exampleRequest('non-inverting');
}

function withPart(before: URLSearchParams, id: string): URLSearchParams {
  const params = new URLSearchParams(before);
  params.set(PART_KEY, id);
  return params;
}

/** Named conditions bring the part with them that was chosen at them. */
interface ShownRequest extends RankingRequest {
  partIds?: readonly string[];
}

/** Keys of what doesn't belong to the conditions: they stay when the conditions change. */
const KEPT_KEYS: readonly string[] = [...SEARCH_KEYS, PART_KEY];

function addressOf(request: ShownRequest, named: string | null, before: URLSearchParams): URLSearchParams {
  const params = writeAddress(request);
  if (named !== null) params.set(NAMED_KEY, named);
  for (const key of KEPT_KEYS) {
    const text = before.get(key);
    if (text !== null) params.set(key, text);
  }
  const wanted = before.get(WANTED_KEY);
  if (wanted !== null && keepsNetwork(requestOf(before), request)) params.set(WANTED_KEY, wanted);
  if (request.partIds?.[0] !== undefined) params.set(PART_KEY, request.partIds[0]);
  return params;
}

/** What stands in the way of ranking; what the address said wrong comes on top, but a default stands in for it. */
function problemsOf(request: RankingRequest, addressErrors: readonly FieldError[]) {
  const blocking = checkConditions(request);
  return { blocking, messages: messagesOf([...blocking, ...addressErrors]) };
}

function messagesOf(errors: readonly FieldError[]): ReadonlyMap<string, string> {
  return new Map(errors.map(({ field, message }) => [field, message]));
}
