import { Controller, Get, Param } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { PartOffersDto } from './dto/part-offers.dto.js';
import { PartOffersService } from './part-offers.service.js';

@ApiTags('prices')
@Controller('parts')
export class PartOffersController {
  constructor(private readonly offers: PartOffersService) {}

  @Get(':id/offers')
  @Access('prices.read')
  @ApiOkResponse({ type: PartOffersDto })
  listPartOffers(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<PartOffersDto> {
    return this.offers.list(caller, id);
  }
}
