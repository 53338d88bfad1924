import { PART_FIELDS, type PartFieldKey } from '@roothertz/common/parts';
import type { Presence } from '../shared/validation/presence.js';
import { StoredText } from '../shared/validation/stored-text.decorator.js';

/** A text that every part has, as the catalogue of fields says. */
export function PartText(key: PartFieldKey, presence?: Presence): PropertyDecorator {
  return StoredText(
    PART_FIELDS.find((field) => field.key === key)!,
    presence,
  );
}
