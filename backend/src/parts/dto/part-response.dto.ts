import {
  type Approval,
  APPROVALS,
  LIBRARIES,
  type Library,
  type Lifecycle,
  LIFECYCLES,
} from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';

/** What an answer says of every part, whatever its kind. */
export class PartResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ enum: LIBRARIES })
  library: Library;

  @ApiProperty()
  manufacturer: string;

  @ApiProperty()
  partNumber: string;

  @ApiProperty()
  description: string;

  @ApiProperty()
  package: string;

  @ApiProperty({ enum: LIFECYCLES })
  lifecycle: Lifecycle;

  @ApiProperty({ enum: APPROVALS })
  approval: Approval;

  @ApiProperty({ type: 'integer' })
  version: number;

  @ApiProperty({ type: String, format: 'date-time' })
  updatedAt: string;
}
