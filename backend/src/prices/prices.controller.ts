import { Body, Controller, Get, Put, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ListPricesDto, PriceListDto } from './dto/list-prices.dto.js';
import { OfferListDto } from './dto/offer-response.dto.js';
import { PriceCountsDto } from './dto/price-counts.dto.js';
import { PriceSettingsDto } from './dto/price-settings.dto.js';
import { RatesResponseDto, SaveRatesDto } from './dto/rates.dto.js';
import { SavePricesDto } from './dto/save-offers.dto.js';
import { OffersService } from './offers.service.js';
import { PriceListService } from './price-list.service.js';
import { PriceSettingsService } from './price-settings.service.js';
import { RatesService } from './rates.service.js';

@ApiTags('prices')
@Controller('prices')
export class PricesController {
  constructor(
    private readonly prices: PriceListService,
    private readonly offers: OffersService,
    private readonly rates: RatesService,
    private readonly settings: PriceSettingsService,
  ) {}

  @Get()
  @Access('prices.read')
  @ApiOkResponse({ type: PriceListDto })
  listPrices(@Caller() caller: CallerOfRequest, @Query() query: ListPricesDto): Promise<PriceListDto> {
    return this.prices.list(caller, query);
  }

  @Get('counts')
  @Access('prices.read')
  @ApiOkResponse({ type: PriceCountsDto })
  countPrices(@Caller() caller: CallerOfRequest): Promise<PriceCountsDto> {
    return this.prices.count(caller);
  }

  @Put()
  @Access('prices.edit')
  @ApiOkResponse({
    type: OfferListDto,
    description: 'The offers as they stand now, in the order of the rows.',
  })
  savePrices(@Caller() caller: CallerOfRequest, @Body() { rows }: SavePricesDto): Promise<OfferListDto> {
    return this.offers.saveRows(caller, rows);
  }

  @Get('rates')
  @Access('prices.read')
  @ApiOkResponse({ type: RatesResponseDto })
  getRates(@Caller() caller: CallerOfRequest): Promise<RatesResponseDto> {
    return this.rates.read(caller);
  }

  @Put('rates')
  @Access('prices.edit')
  @ApiOkResponse({ type: RatesResponseDto })
  saveRates(@Caller() caller: CallerOfRequest, @Body() dto: SaveRatesDto): Promise<RatesResponseDto> {
    return this.rates.save(caller, dto);
  }

  @Get('settings')
  @Access('prices.read')
  @ApiOkResponse({ type: PriceSettingsDto })
  getPriceSettings(@Caller() caller: CallerOfRequest): Promise<PriceSettingsDto> {
    return this.settings.read(caller);
  }

  @Put('settings')
  @Access('prices.edit')
  @ApiOkResponse({ type: PriceSettingsDto })
  savePriceSettings(
    @Caller() caller: CallerOfRequest,
    @Body() dto: PriceSettingsDto,
  ): Promise<PriceSettingsDto> {
    return this.settings.change(caller, dto);
  }
}
