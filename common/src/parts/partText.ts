import { normaliseWord } from './normalise.js';
import type { OptionWords } from './optionWords.js';
import type { TextField } from './partFields.js';
import type { Reading } from './reading.js';

/**
 * A text as it is stored: without spaces at its ends and in Unicode form NFC. It is refused where it is
 * longer than the field allows, empty though the field is required, or holds a line break, another
 * control character or half a character.
 */
export function readText(field: TextField, input: string): Reading<string> {
  const text = input.trim().normalize('NFC');
  const message = textError(field, text);
  return message === null ? { ok: true, value: text } : { ok: false, message: `${field.label}: ${message}` };
}

/**
 * The option of a field that a list means by a word: the option itself, its label or another word for it, compared
 * without case, accents and punctuation. Refused, naming the options, where it means none of them.
 */
export function readOption<Option extends string>(
  label: string,
  labels: Record<Option, string>,
  input: string,
  words?: OptionWords<Option>,
): Reading<Option> {
  const word = normaliseWord(input);
  const options = Object.keys(labels) as Option[];
  const value = options.find((option) =>
    [option, labels[option], ...(words?.[option] ?? [])].some((name) => normaliseWord(name) === word),
  );
  return value === undefined
    ? { ok: false, message: `${label}: one of ${options.join(', ')} was expected` }
    : { ok: true, value };
}

function textError(field: TextField, text: string): string | null {
  if (text === '' && field.required) return 'a text was expected';
  if (/[\p{Cc}\p{Cs}\p{Zl}\p{Zp}]/u.test(text))
    return 'a text on one line, without control characters, was expected';
  const length = Math.max(text.length, text.normalize('NFKC').length);
  return length > field.maxLength ? `at most ${field.maxLength} characters were expected` : null;
}
