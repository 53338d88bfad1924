import { MAIL_KINDS, NOTICE_KINDS, type NoticeKind } from '@roothertz/common/mail';
import { ApiProperty } from '@nestjs/swagger';
import { IsBoolean } from 'class-validator';
import { Option } from '../../shared/validation/option.decorator.js';

export class NoticeDto {
  @ApiProperty({ enum: NOTICE_KINDS })
  kind: NoticeKind;

  @ApiProperty({ description: 'What the notices are about.' })
  label: string;
}

class MailPreferenceDto extends NoticeDto {
  @ApiProperty()
  wanted: boolean;
}

export class MailPreferencesDto {
  @ApiProperty({ type: [MailPreferenceDto] })
  items: MailPreferenceDto[];
}

export class ChangeMailPreferenceDto {
  @Option(NOTICE_KINDS)
  kind: NoticeKind;

  @IsBoolean({ message: 'wanted: true or false was expected' })
  @ApiProperty()
  wanted: boolean;
}

export function toNotice(kind: NoticeKind): NoticeDto {
  return { kind, label: MAIL_KINDS[kind].label };
}

export function toMailPreferences(
  kinds: readonly NoticeKind[],
  refused: readonly string[],
): MailPreferencesDto {
  return { items: kinds.map((kind) => ({ ...toNotice(kind), wanted: !refused.includes(kind) })) };
}
