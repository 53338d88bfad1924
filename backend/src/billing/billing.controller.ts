import { Body, Controller, Get, HttpCode, Post, Put, Req } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { AppConfig } from '../config/app-config.js';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { BillingSync } from './billing-sync.service.js';
import { BillingService } from './billing.service.js';
import { Checkouts } from './checkouts.service.js';
import { BillingResponseDto } from './dto/billing-response.dto.js';
import { BillingPageDto, ChangeSeatsDto, SeatPreviewDto, SeatsDto } from './dto/seats.dto.js';
import { SeatChanges } from './seat-changes.service.js';
import { Trials } from './trials.service.js';

@ApiTags('billing')
@Controller('billing')
export class BillingController {
  constructor(
    private readonly billing: BillingService,
    private readonly trials: Trials,
    private readonly checkouts: Checkouts,
    private readonly seatChanges: SeatChanges,
    private readonly syncs: BillingSync,
    private readonly config: AppConfig,
  ) {}

  @Get()
  @Access('billing.read')
  @ApiOkResponse({ type: BillingResponseDto })
  getBilling(@Caller() caller: CallerOfRequest): Promise<BillingResponseDto> {
    return this.billing.find(caller);
  }

  @Post('trial')
  @Access('billing.manage')
  @ApiCreatedResponse({ type: BillingResponseDto })
  async startTrial(@Caller() caller: CallerOfRequest): Promise<BillingResponseDto> {
    await this.trials.start(caller);
    return this.billing.find(caller);
  }

  @Post('checkout')
  @Access('billing.manage')
  @ApiCreatedResponse({ type: BillingPageDto })
  async openCheckout(
    @Caller() caller: CallerOfRequest,
    @Body() { seats }: SeatsDto,
    @Req() request: Request,
  ): Promise<BillingPageDto> {
    return { url: await this.checkouts.open(caller, seats, this.originOf(request)) };
  }

  @Post('portal')
  @Access('billing.manage')
  @ApiCreatedResponse({ type: BillingPageDto })
  async openBillingPortal(
    @Caller() caller: CallerOfRequest,
    @Req() request: Request,
  ): Promise<BillingPageDto> {
    return { url: await this.checkouts.openPortal(caller, this.originOf(request)) };
  }

  @Post('sync')
  @HttpCode(200)
  @Access('billing.manage')
  @ApiOkResponse({ type: BillingResponseDto })
  async syncBilling(@Caller() caller: CallerOfRequest): Promise<BillingResponseDto> {
    await this.syncs.sync(caller);
    return this.billing.find(caller);
  }

  @Post('seats/preview')
  @HttpCode(200)
  @Access('billing.manage')
  @ApiOkResponse({ type: SeatPreviewDto })
  previewSeats(@Caller() caller: CallerOfRequest, @Body() { seats }: SeatsDto): Promise<SeatPreviewDto> {
    return this.seatChanges.preview(caller, seats);
  }

  @Put('seats')
  @Access('billing.manage')
  @ApiOkResponse({ type: BillingResponseDto })
  async changeSeats(
    @Caller() caller: CallerOfRequest,
    @Body() { seats, prorationDate }: ChangeSeatsDto,
  ): Promise<BillingResponseDto> {
    await this.seatChanges.change(caller, seats, prorationDate);
    return this.billing.find(caller);
  }

  /** Where the payment service's pages lead back to. */
  private originOf({ protocol, host }: Request): string {
    return this.config.PUBLIC_ORIGIN ?? `${protocol}://${host}`;
  }
}
