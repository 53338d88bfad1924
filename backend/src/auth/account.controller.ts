import { Body, Controller, Get, HttpCode, Ip, Patch, Post, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Response } from 'express';
import { AppConfig } from '../config/app-config.js';
import { Access } from '../shared/access/access.decorator.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { AccountService } from './account.service.js';
import { CloseAccount } from './close-account.service.js';
import { DepartureListDto, toDeparture } from './dto/account-response.dto.js';
import { ChangeAddressDto, ChangePasswordDto, CloseAccountDto, RenameAccountDto } from './dto/account.dto.js';
import type { SessionCaller } from './session-caller.js';
import { clearSessionCookie } from './session-cookie.js';

@ApiTags('account')
@Controller('account')
export class AccountController {
  constructor(
    private readonly accounts: AccountService,
    private readonly closing: CloseAccount,
    private readonly config: AppConfig,
  ) {}

  @Patch()
  @HttpCode(204)
  @Access('session.own')
  @ApiNoContentResponse()
  renameAccount(@Caller() caller: SessionCaller, @Body() { name }: RenameAccountDto): Promise<void> {
    return this.accounts.rename(caller, name);
  }

  @Post('password')
  @HttpCode(204)
  @Access('session.own')
  @ApiNoContentResponse({ description: 'The other sessions are over.' })
  changePassword(
    @Caller() caller: SessionCaller,
    @Ip() address: string,
    @Body() { currentPassword, newPassword }: ChangePasswordDto,
  ): Promise<void> {
    return this.accounts.changePassword(caller, address, currentPassword, newPassword);
  }

  @Post('email')
  @HttpCode(204)
  @Access('session.own')
  @ApiNoContentResponse({ description: 'The new address is asked for its consent.' })
  changeAddress(
    @Caller() caller: SessionCaller,
    @Ip() address: string,
    @Body() { email, password }: ChangeAddressDto,
  ): Promise<void> {
    return this.accounts.askForAddress(caller, address, password, email);
  }

  @Get('closing')
  @Access('session.own')
  @ApiOkResponse({ type: DepartureListDto })
  async foreseeClosing(@Caller() caller: SessionCaller): Promise<DepartureListDto> {
    return { items: (await this.closing.foresee(caller)).map(toDeparture) };
  }

  @Post('close')
  @HttpCode(204)
  @Access('session.own')
  @ApiNoContentResponse()
  async closeAccount(
    @Caller() caller: SessionCaller,
    @Ip() address: string,
    @Body() { password }: CloseAccountDto,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.closing.close(caller, address, password);
    clearSessionCookie(response, this.config);
  }
}
