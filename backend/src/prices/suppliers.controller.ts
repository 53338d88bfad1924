import { Body, Controller, Get, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ListQueryDto } from '../shared/list/list-query.dto.js';
import { CreateSupplierDto, SupplierListDto, SupplierResponseDto } from './dto/supplier.dto.js';
import { SuppliersService } from './suppliers.service.js';

@ApiTags('prices')
@Controller('suppliers')
export class SuppliersController {
  constructor(private readonly suppliers: SuppliersService) {}

  @Get()
  @Access('prices.read')
  @ApiOkResponse({ type: SupplierListDto })
  listSuppliers(@Caller() caller: CallerOfRequest, @Query() query: ListQueryDto): Promise<SupplierListDto> {
    return this.suppliers.list(caller, query);
  }

  @Post()
  @Access('prices.edit')
  @ApiCreatedResponse({ type: SupplierResponseDto })
  createSupplier(
    @Caller() caller: CallerOfRequest,
    @Body() dto: CreateSupplierDto,
  ): Promise<SupplierResponseDto> {
    return this.suppliers.create(caller, dto);
  }
}
