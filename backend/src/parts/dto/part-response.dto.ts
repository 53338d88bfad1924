import { ApiProperty } from '@nestjs/swagger';
import { PartNameDto } from '../../shared/parts/part-name.dto.js';

/** What an answer says of every part, whatever its kind. */
export class PartResponseDto extends PartNameDto {
  @ApiProperty()
  description: string;

  @ApiProperty({ type: 'integer' })
  version: number;

  @ApiProperty({ type: String, format: 'date-time' })
  updatedAt: string;
}
