import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ListQueryDto } from '../shared/list/list-query.dto.js';
import { VersionQueryDto } from '../shared/list/version-query.dto.js';
import { ConditionsService } from './conditions.service.js';
import { ConditionsListDto, ConditionsResponseDto } from './dto/conditions-response.dto.js';
import { SaveConditionsDto } from './dto/save-conditions.dto.js';
import { UpdateConditionsDto } from './dto/update-conditions.dto.js';

@ApiTags('conditions')
@Controller('conditions')
export class ConditionsController {
  constructor(private readonly conditions: ConditionsService) {}

  @Get()
  @Access('conditions.read')
  @ApiOkResponse({ type: ConditionsListDto })
  listConditions(
    @Caller() caller: CallerOfRequest,
    @Query() query: ListQueryDto,
  ): Promise<ConditionsListDto> {
    return this.conditions.list(caller, query);
  }

  @Post()
  @Access('conditions.save')
  @ApiCreatedResponse({ type: ConditionsResponseDto })
  saveConditions(
    @Caller() caller: CallerOfRequest,
    @Body() dto: SaveConditionsDto,
  ): Promise<ConditionsResponseDto> {
    return this.conditions.save(caller, dto);
  }

  @Get(':id')
  @Access('conditions.read')
  @ApiOkResponse({ type: ConditionsResponseDto })
  getConditions(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<ConditionsResponseDto> {
    return this.conditions.find(caller, id);
  }

  @Patch(':id')
  @Access('conditions.save')
  @ApiOkResponse({ type: ConditionsResponseDto })
  updateConditions(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Body() dto: UpdateConditionsDto,
  ): Promise<ConditionsResponseDto> {
    return this.conditions.update(caller, id, dto);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('conditions.save')
  @ApiNoContentResponse()
  deleteConditions(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<void> {
    return this.conditions.remove(caller, id, version);
  }
}
