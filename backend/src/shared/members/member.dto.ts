import { ApiProperty } from '@nestjs/swagger';

/** Who did something. */
export class MemberDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;
}

export function toMemberDto(user: { id: number; name: string } | null): MemberDto | null {
  return user && { id: String(user.id), name: user.name };
}
