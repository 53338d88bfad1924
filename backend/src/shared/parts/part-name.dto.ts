import {
  type Approval,
  APPROVALS,
  LIBRARIES,
  type Library,
  type Lifecycle,
  LIFECYCLES,
} from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';

/** What an answer names a part by, whatever its kind, and how the part stands. */
export class PartNameDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ enum: LIBRARIES })
  library: Library;

  @ApiProperty()
  manufacturer: string;

  @ApiProperty()
  partNumber: string;

  @ApiProperty()
  package: string;

  @ApiProperty({ enum: LIFECYCLES })
  lifecycle: Lifecycle;

  @ApiProperty({ enum: APPROVALS })
  approval: Approval;
}
