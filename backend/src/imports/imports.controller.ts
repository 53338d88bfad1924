import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Param,
  Post,
  Put,
  Query,
  type StreamableFile,
  UploadedFile,
  UseInterceptors,
} from '@nestjs/common';
import {
  ApiAcceptedResponse,
  ApiBody,
  ApiConsumes,
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ListQueryDto } from '../shared/list/list-query.dto.js';
import { ApiCsv, csvAnswer } from '../shared/csv/csv-answer.js';
import { ImportListDto, ImportResponseDto } from './dto/import-response.dto.js';
import { ImportRowListDto, ListImportRowsDto } from './dto/import-rows.dto.js';
import { MapImportDto } from './dto/map-import.dto.js';
import { UploadFormDto, UploadImportDto } from './dto/upload-import.dto.js';
import { ImportRowsService } from './import-rows.service.js';
import { ImportsService } from './imports.service.js';
import { UploadInterceptor } from './upload.interceptor.js';
import type { ReceivedFile } from './uploads.service.js';

@ApiTags('imports')
@Controller('imports')
export class ImportsController {
  constructor(
    private readonly imports: ImportsService,
    private readonly rows: ImportRowsService,
  ) {}

  @Get()
  @Access('parts.read')
  @ApiOkResponse({ type: ImportListDto })
  listImports(@Caller() caller: CallerOfRequest, @Query() query: ListQueryDto): Promise<ImportListDto> {
    return this.imports.list(caller, query);
  }

  @Post()
  @Access('lists.import')
  @UseInterceptors(UploadInterceptor)
  @ApiConsumes('multipart/form-data')
  @ApiBody({ type: UploadFormDto })
  @ApiCreatedResponse({ type: ImportResponseDto })
  uploadImport(
    @Caller() caller: CallerOfRequest,
    @Body() { kind }: UploadImportDto,
    @UploadedFile() file: ReceivedFile,
  ): Promise<ImportResponseDto> {
    return this.imports.upload(caller, kind, file);
  }

  @Get(':id')
  @Access('parts.read')
  @ApiOkResponse({ type: ImportResponseDto })
  getImport(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<ImportResponseDto> {
    return this.imports.find(caller, id);
  }

  @Put(':id/mapping')
  @Access('lists.import')
  @ApiOkResponse({ type: ImportResponseDto })
  mapImport(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Body() dto: MapImportDto,
  ): Promise<ImportResponseDto> {
    return this.imports.map(caller, id, dto);
  }

  @Get(':id/rows')
  @Access('parts.read')
  @ApiOkResponse({ type: ImportRowListDto })
  listImportRows(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Query() query: ListImportRowsDto,
  ): Promise<ImportRowListDto> {
    return this.rows.list(caller, id, query);
  }

  @Get(':id/refused.csv')
  @Access('parts.read')
  @ApiCsv()
  async getRefusedRows(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<StreamableFile> {
    return csvAnswer(await this.rows.refusedList(caller, id));
  }

  @Post(':id/apply')
  @HttpCode(202)
  @Access('lists.import')
  @ApiAcceptedResponse({ type: ImportResponseDto })
  applyImport(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<ImportResponseDto> {
    return this.imports.apply(caller, id);
  }

  @Post(':id/cancel')
  @HttpCode(202)
  @Access('lists.import')
  @ApiAcceptedResponse({ type: ImportResponseDto })
  cancelImport(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<ImportResponseDto> {
    return this.imports.cancel(caller, id);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('lists.import')
  @ApiNoContentResponse()
  discardImport(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<void> {
    return this.imports.discard(caller, id);
  }

  @Post(':id/undo')
  @HttpCode(202)
  @Access('lists.import')
  @ApiAcceptedResponse({ type: ImportResponseDto })
  undoImport(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<ImportResponseDto> {
    return this.imports.undo(caller, id);
  }
}
