import { ApiProperty } from '@nestjs/swagger';

export class UsingConditionsDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;
}

/** Where a team has chosen a part. */
export class PartUsesDto {
  @ApiProperty({ type: [UsingConditionsDto], description: 'Saved conditions at which it was chosen.' })
  conditions: UsingConditionsDto[];
}
