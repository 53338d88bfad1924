import { Body, Controller, Get, HttpCode, Param, Post, Put } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { Public } from '../shared/access/public.decorator.js';
import {
  ChangeMailPreferenceDto,
  MailPreferencesDto,
  NoticeDto,
  toNotice,
} from './dto/mail-preferences.dto.js';
import { MailPreferences } from './mail-preferences.service.js';

@ApiTags('mail')
@Controller('mail')
export class MailController {
  constructor(private readonly preferences: MailPreferences) {}

  @Get('preferences')
  @Access('session.own')
  @ApiOkResponse({ type: MailPreferencesDto })
  listMailPreferences(@Caller() caller: CallerOfRequest): Promise<MailPreferencesDto> {
    return this.preferences.list(caller);
  }

  @Put('preferences')
  @Access('session.own')
  @ApiOkResponse({ type: MailPreferencesDto })
  changeMailPreference(
    @Caller() caller: CallerOfRequest,
    @Body() { kind, wanted }: ChangeMailPreferenceDto,
  ): Promise<MailPreferencesDto> {
    return this.preferences.change(caller, kind, wanted);
  }

  @Public()
  @Get('unsubscribe/:token')
  @ApiOkResponse({ type: NoticeDto })
  getUnsubscription(@Param('token') token: string): NoticeDto {
    return toNotice(this.preferences.readLink(token).kind);
  }

  /** Mail programs post here by themselves (RFC 8058): the form that they send says nothing that is needed. */
  @Public()
  @Post('unsubscribe/:token')
  @HttpCode(200)
  @ApiOkResponse({ type: NoticeDto })
  async unsubscribe(@Param('token') token: string): Promise<NoticeDto> {
    return toNotice((await this.preferences.refuseByLink(token)).kind);
  }
}
