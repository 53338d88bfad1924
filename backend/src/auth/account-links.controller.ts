import { Body, Controller, Get, HttpCode, Ip, Param, Post } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Public } from '../shared/access/public.decorator.js';
import { AccountTokens } from './account-tokens.service.js';
import { Confirmations } from './confirmations.service.js';
import { EmailDto, ResetPasswordDto, SignUpDto, TokenDto } from './dto/account.dto.js';
import { LinkResponseDto, toLinkResponse } from './dto/account-response.dto.js';
import { PasswordReset } from './password-reset.service.js';
import { SignUpService } from './sign-up.service.js';

const ALIKE = 'Says the same whether or not the address has an account: its mailbox is told.';

/** What is done by an e-mail's link, without a session. */
@ApiTags('account')
@Controller('auth')
export class AccountLinksController {
  constructor(
    private readonly signUps: SignUpService,
    private readonly resets: PasswordReset,
    private readonly confirmations: Confirmations,
    private readonly tokens: AccountTokens,
  ) {}

  @Public()
  @Post('sign-up')
  @HttpCode(204)
  @ApiNoContentResponse({ description: ALIKE })
  signUp(@Body() asked: SignUpDto, @Ip() address: string): Promise<void> {
    return this.signUps.signUp(asked, address);
  }

  @Public()
  @Post('password-resets')
  @HttpCode(204)
  @ApiNoContentResponse({ description: ALIKE })
  askForPasswordReset(@Body() { email }: EmailDto, @Ip() address: string): Promise<void> {
    return this.resets.ask(email, address);
  }

  @Public()
  @Get('links/:token')
  @ApiOkResponse({ type: LinkResponseDto })
  async getAccountLink(@Param('token') token: string): Promise<LinkResponseDto> {
    return toLinkResponse(await this.tokens.read(token));
  }

  @Public()
  @Post('confirm')
  @HttpCode(204)
  @ApiNoContentResponse()
  confirmAddress(@Body() { token }: TokenDto): Promise<void> {
    return this.confirmations.confirm(token);
  }

  @Public()
  @Post('reset-password')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'All sessions of the account are over.' })
  resetPassword(@Body() { token, password }: ResetPasswordDto): Promise<void> {
    return this.resets.reset(token, password);
  }
}
