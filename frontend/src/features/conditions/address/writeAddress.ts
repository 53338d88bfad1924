import type { ConditionFieldPath, RankingRequest } from '@roothertz/common/conditions';
import { exampleRequest } from '../exampleRequest';
import { fieldOf } from '../fieldOf';
import { valueAt } from '../requestPath';
import { stageKindOf } from '../stageKind';
import { CHOICE_KEYS, QUANTITY_KEYS, STAGE_KEY, TEXT_KEYS } from './addressKeys';
import { writeAddressQuantity } from './addressQuantity';

/** The request as a query string: the stage, and whatever differs from that stage's example. */
export function writeAddress(request: RankingRequest): URLSearchParams {
  const kind = stageKindOf(request.conditions.stage);
  const example = exampleRequest(kind);
  const { topology } = request.conditions.stage;
  const params = new URLSearchParams({ [STAGE_KEY]: kind });
  const write = (key: string, path: string, text: (value: unknown) => string) => {
    const value = valueAt(request, path);
    const usual = valueAt(example, path);
    if (value === undefined && usual !== undefined) params.set(key, NONE);
    else if (value !== undefined && value !== usual) params.set(key, text(value));
  };
  for (const [key, path] of Object.entries(QUANTITY_KEYS))
    write(key, path, (value) => quantityText(value, path, topology));
  for (const [key, { path }] of Object.entries(CHOICE_KEYS)) write(key, path, choiceText);
  for (const [key, path] of Object.entries(TEXT_KEYS)) write(key, path, String);
  return params;
}

/** What stands for a value that the example has and this request hasn't. */
export const NONE = 'none';

function quantityText(value: unknown, path: ConditionFieldPath, topology: Parameters<typeof fieldOf>[1]) {
  return typeof value === 'number'
    ? writeAddressQuantity(value, fieldOf(path, topology).kind)
    : String(value);
}

function choiceText(value: unknown): string {
  return Array.isArray(value) ? value.join(' ') : String(value);
}
