import { Controller, Get, Param } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { PartUsesDto } from './dto/part-uses.dto.js';
import { PartUsesService } from './part-uses.service.js';

@ApiTags('parts')
@Controller('parts')
export class PartUsesController {
  constructor(private readonly uses: PartUsesService) {}

  @Get(':id/uses')
  @Access('parts.read')
  @ApiOkResponse({ type: PartUsesDto })
  listPartUses(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<PartUsesDto> {
    return this.uses.find(caller, id);
  }
}
