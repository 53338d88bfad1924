import { Body, Controller, Get, Headers, HttpCode, Ip, Post, Req, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Throttle } from '@nestjs/throttler';
import type { Request, Response } from 'express';
import { AppConfig } from '../config/app-config.js';
import { Access } from '../shared/access/access.decorator.js';
import { Caller } from '../shared/access/caller.decorator.js';
import type { Caller as SignedIn } from '../shared/access/caller.js';
import { Public } from '../shared/access/public.decorator.js';
import { AuthService } from './auth.service.js';
import { SessionResponseDto } from './dto/session-response.dto.js';
import { SignInDto } from './dto/sign-in.dto.js';
import { clearSessionCookie, readSessionCookie, setSessionCookie } from './session-cookie.js';
import { SessionsService } from './sessions.service.js';

const SIGN_INS_A_MINUTE = 60;

@ApiTags('session')
@Controller('auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly sessions: SessionsService,
    private readonly config: AppConfig,
  ) {}

  @Public()
  @Throttle({ default: { limit: SIGN_INS_A_MINUTE, ttl: 60_000 } })
  @Post('sign-in')
  @HttpCode(200)
  @ApiOkResponse({ type: SessionResponseDto })
  async signIn(
    @Body() credentials: SignInDto,
    @Ip() address: string,
    @Headers('user-agent') userAgent = '',
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionResponseDto> {
    const member = await this.auth.signIn(credentials, address);
    setSessionCookie(response, await this.sessions.begin(member, { address, userAgent }), this.config);
    return this.auth.describe(member);
  }

  @Public()
  @Post('sign-out')
  @HttpCode(204)
  @ApiNoContentResponse()
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    clearSessionCookie(response, this.config);
    const token = readSessionCookie(request);
    if (token !== null) await this.sessions.endByToken(token);
  }

  @Access('session.own')
  @Get('me')
  @ApiOkResponse({ type: SessionResponseDto })
  getSession(@Caller() caller: SignedIn): Promise<SessionResponseDto> {
    return this.auth.findSession(caller);
  }
}
