import { type ConditionFieldPath, type RankingRequest } from '@roothertz/common/conditions';
import type { FieldError } from '@roothertz/common/parts';
import { exampleRequest } from '../exampleRequest';
import { fieldOf } from '../fieldOf';
import { withValue } from '../requestPath';
import { hasStageField, STAGE_KINDS, type StageKind } from '../stageKind';
import { CHOICE_KEYS, QUANTITY_KEYS, STAGE_KEY, TEXT_KEYS } from './addressKeys';
import { readAddressQuantity } from './addressQuantity';
import { NONE } from './writeAddress';

export interface AddressContent {
  request: RankingRequest;
  /** What couldn't be read, field by field; the example's value stands in for it. */
  errors: FieldError[];
}

type Setting = { path: string; value: unknown } | FieldError;

const LONGEST_TEXT = 200;

/** The request that an address holds; null where it names no stage, as on a first visit. */
export function readAddress(params: URLSearchParams): AddressContent | null {
  const stage = params.get(STAGE_KEY);
  if (stage === null) return null;
  const kind = STAGE_KINDS.find((known) => known === stage);
  const errors: FieldError[] = kind ? [] : [unknownWord('conditions.stage.topology', stage, STAGE_KINDS)];
  let request = exampleRequest(kind ?? 'non-inverting');
  for (const setting of settingsOf(params, kind ?? 'non-inverting')) {
    if ('message' in setting) errors.push(setting);
    else request = withValue(request, setting.path, setting.value);
  }
  return { request, errors };
}

function settingsOf(params: URLSearchParams, kind: StageKind): Setting[] {
  const topology = kind === 'follower' ? 'non-inverting' : kind;
  const quantities = Object.entries(QUANTITY_KEYS)
    .filter(([, path]) => !isForeign(path, kind))
    .map(([key, path]) =>
      settingAt(params, key, (text) => readQuantity(text, path, fieldOf(path, topology))),
    );
  const choices = Object.entries(CHOICE_KEYS).map(([key, choice]) =>
    settingAt(params, key, (text) => readChoice(text, choice)),
  );
  const texts = Object.entries(TEXT_KEYS).map(([key, path]) =>
    settingAt(params, key, (text) => ({ path, value: text.slice(0, LONGEST_TEXT) })),
  );
  return [...quantities, ...choices, ...texts].flat();
}

function settingAt(params: URLSearchParams, key: string, read: (text: string) => Setting): Setting[] {
  const text = params.get(key);
  return text === null ? [] : [read(text)];
}

/** Whether the field belongs to another kind of stage. */
function isForeign(path: ConditionFieldPath, kind: StageKind): boolean {
  const [, part, field] = path.split('.');
  if (part === 'stage') return !hasStageField(kind, field);
  return path === 'conditions.source.directCurrent' && kind !== 'transimpedance';
}

function readQuantity(text: string, path: ConditionFieldPath, field: ReturnType<typeof fieldOf>): Setting {
  if (text === NONE && MAY_BE_NONE.includes(path)) return { path, value: undefined };
  const reading = readAddressQuantity(text, field, path === 'conditions.stage.feedbackCapacitance');
  return reading.ok ? { path, value: reading.value } : { field: path, message: reading.message };
}

/** The only value that an example has and that a stage may go without. */
const MAY_BE_NONE: readonly ConditionFieldPath[] = [
  'conditions.stage.feedbackCapacitance',
  'conditions.stage.gainResistance',
];

function readChoice(
  text: string,
  { path, words, several }: { path: string; words: readonly string[]; several: boolean },
): Setting {
  const chosen = several ? text.split(/[ ,]/) : [text];
  const unknown = chosen.find((word) => !words.includes(word));
  if (unknown !== undefined) return unknownWord(path, unknown, words);
  return { path, value: several ? [...new Set(chosen)] : text };
}

function unknownWord(field: string, word: string, words: readonly string[]): FieldError {
  return { field, message: `the address said “${word.slice(0, 40)}”: ${words.join(', ')} was expected` };
}
