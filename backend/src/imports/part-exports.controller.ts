import { Controller, Get, Query, type StreamableFile } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ApiCsv, csvAnswer } from '../shared/csv/csv-answer.js';
import { ExportQueryDto } from './dto/export-query.dto.js';
import { PartExports } from './part-exports.service.js';

@ApiTags('imports')
@Controller()
export class PartExportsController {
  constructor(private readonly exports: PartExports) {}

  @Get('op-amps.csv')
  @Access('parts.read')
  @ApiCsv()
  exportOpAmps(@Caller() caller: CallerOfRequest, @Query() query: ExportQueryDto): StreamableFile {
    return csvAnswer(this.exports.export(caller, 'op-amps', query));
  }

  @Get('resistors.csv')
  @Access('parts.read')
  @ApiCsv()
  exportResistors(@Caller() caller: CallerOfRequest, @Query() query: ExportQueryDto): StreamableFile {
    return csvAnswer(this.exports.export(caller, 'resistors', query));
  }
}
