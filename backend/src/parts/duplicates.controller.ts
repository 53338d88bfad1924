import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { PartPairDto } from './dto/part-pair.dto.js';
import { DuplicatesService } from './duplicates.service.js';

@ApiTags('parts')
@Controller('duplicates')
export class DuplicatesController {
  constructor(private readonly duplicates: DuplicatesService) {}

  @Post('keep-both')
  @HttpCode(204)
  @Access('parts.edit')
  @ApiNoContentResponse()
  keepBothParts(@Caller() caller: CallerOfRequest, @Body() dto: PartPairDto): Promise<void> {
    return this.duplicates.keepBoth(caller, dto);
  }

  /** Takes the decision to keep both back. */
  @Post('ask-again')
  @HttpCode(204)
  @Access('parts.edit')
  @ApiNoContentResponse()
  askAgainAboutParts(@Caller() caller: CallerOfRequest, @Body() dto: PartPairDto): Promise<void> {
    return this.duplicates.askAgain(caller, dto);
  }
}
