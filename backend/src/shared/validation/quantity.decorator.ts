import { boundsError, type QuantityField } from '@roothertz/common/parts';
import { QUANTITIES } from '@roothertz/common/units';
import { applyDecorators } from '@nestjs/common';
import { ApiProperty, type ApiPropertyOptions } from '@nestjs/swagger';
import { ValidateBy } from 'class-validator';
import { type Presence, skipAbsent } from './presence.js';

export interface QuantityOptions extends Presence {
  /** The word `auto` may stand in place of the number: the server works it out. */
  orAuto?: boolean;
}

/** A number in SI units within the bounds that the catalogue gives its field, checked and documented. */
export function Quantity(field: QuantityField, options: QuantityOptions = {}): PropertyDecorator {
  return applyDecorators(
    ...skipAbsent(options),
    ValidateBy({
      name: 'quantity',
      validator: {
        validate: (value) => (options.orAuto && value === 'auto') || boundsError(field, value) === null,
        defaultMessage: (args) => boundsError(field, args?.value) ?? '',
      },
    }),
    ApiProperty(describeQuantity(field, options)),
  );
}

function describeQuantity(field: QuantityField, options: QuantityOptions): ApiPropertyOptions {
  const number = { type: field.integer ? ('integer' as const) : ('number' as const), ...apiBounds(field) };
  return {
    description: describeField(field),
    required: !options.optional,
    nullable: options.nullable,
    ...(options.orAuto ? { oneOf: [number, { type: 'string', enum: ['auto'] }] } : number),
  } as ApiPropertyOptions;
}

function describeField({ help, kind }: QuantityField): string {
  const { unit } = QUANTITIES[kind];
  return unit === '' ? help : `${help} In ${unit}.`;
}

function apiBounds({ bounds: { above, from, to } }: QuantityField): object {
  if (above !== undefined) return { minimum: above, exclusiveMinimum: true, maximum: to };
  return { ...(from !== undefined && { minimum: from }), maximum: to };
}
