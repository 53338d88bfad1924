import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { VersionQueryDto } from '../shared/list/version-query.dto.js';
import { OfferListDto, OfferResponseDto } from './dto/offer-response.dto.js';
import { PriceHistoryDto, PriceHistoryQueryDto } from './dto/part-offers.dto.js';
import { ConfirmOffersDto, CreateOfferDto, UpdateOfferDto } from './dto/save-offers.dto.js';
import { OffersService } from './offers.service.js';
import { PartOffersService } from './part-offers.service.js';

@ApiTags('prices')
@Controller('offers')
export class OffersController {
  constructor(
    private readonly offers: OffersService,
    private readonly partOffers: PartOffersService,
  ) {}

  @Post()
  @Access('prices.edit')
  @ApiCreatedResponse({ type: OfferResponseDto })
  createOffer(@Caller() caller: CallerOfRequest, @Body() dto: CreateOfferDto): Promise<OfferResponseDto> {
    return this.offers.create(caller, dto);
  }

  @Post('confirm')
  @HttpCode(200)
  @Access('prices.edit')
  @ApiOkResponse({ type: OfferListDto })
  confirmOffers(@Caller() caller: CallerOfRequest, @Body() { ids }: ConfirmOffersDto): Promise<OfferListDto> {
    return this.offers.confirm(caller, ids);
  }

  @Post('confirm/undo')
  @HttpCode(200)
  @Access('prices.edit')
  @ApiOkResponse({ type: OfferListDto })
  undoConfirmation(
    @Caller() caller: CallerOfRequest,
    @Body() { ids }: ConfirmOffersDto,
  ): Promise<OfferListDto> {
    return this.offers.takeBack(caller, ids);
  }

  @Get('history')
  @Access('prices.read')
  @ApiOkResponse({ type: PriceHistoryDto })
  getPriceHistory(
    @Caller() caller: CallerOfRequest,
    @Query() query: PriceHistoryQueryDto,
  ): Promise<PriceHistoryDto> {
    return this.partOffers.history(caller, query);
  }

  @Patch(':id')
  @Access('prices.edit')
  @ApiOkResponse({ type: OfferResponseDto })
  updateOffer(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Body() dto: UpdateOfferDto,
  ): Promise<OfferResponseDto> {
    return this.offers.update(caller, id, dto);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('prices.edit')
  @ApiNoContentResponse()
  closeOffer(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<void> {
    return this.offers.close(caller, id, version);
  }
}
