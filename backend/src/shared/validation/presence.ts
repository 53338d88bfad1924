import { ValidateIf } from 'class-validator';

export interface Presence {
  /** The field may be left out. */
  optional?: boolean;
  /** The field may be null. */
  nullable?: boolean;
}

/** Skips a property's checks where it is left out or null and may be. */
export function skipAbsent({ optional, nullable }: Presence): PropertyDecorator[] {
  if (!optional && !nullable) return [];
  return [
    ValidateIf((_, value: unknown) => !((optional && value === undefined) || (nullable && value === null))),
  ];
}
