import { Controller, Get, Query, type StreamableFile } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ApiCsv, csvAnswer } from '../shared/csv/csv-answer.js';
import { AuditService } from './audit.service.js';
import { AuditListDto } from './dto/audit-response.dto.js';
import { AuditFilterDto, ListAuditDto } from './dto/list-audit.dto.js';

@ApiTags('audit')
@Controller('audit')
export class AuditController {
  constructor(private readonly audit: AuditService) {}

  @Get()
  @Access('audit.read')
  @ApiOkResponse({ type: AuditListDto })
  listAuditEntries(@Caller() caller: CallerOfRequest, @Query() query: ListAuditDto): Promise<AuditListDto> {
    return this.audit.list(caller, query);
  }

  @Get('export.csv')
  @Access('audit.read')
  @ApiCsv()
  exportAuditEntries(@Caller() caller: CallerOfRequest, @Query() filter: AuditFilterDto): StreamableFile {
    return csvAnswer(this.audit.export(caller, filter));
  }
}
