import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { IsInt, Max, Min } from 'class-validator';
import { type Presence, skipAbsent } from './presence.js';

const MESSAGE = 'version: the version that was last read was expected';

/** The version on which a change is based: a change of what has changed meanwhile is refused. */
export function Version(presence: Presence = {}): PropertyDecorator {
  return applyDecorators(
    ...skipAbsent(presence),
    Max(4_294_967_295, { message: MESSAGE }),
    Min(1, { message: MESSAGE }),
    IsInt({ message: MESSAGE }),
    ApiProperty({
      type: 'integer',
      minimum: 1,
      required: !presence.optional,
      description: 'The version that was last read.',
    }),
  );
}
