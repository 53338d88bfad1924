import { Injectable } from '@nestjs/common';
import type { ResistorPart } from '@roothertz/common/parts';
import { ResistorStore } from '../library/resistor-store.service.js';
import type { Caller } from '../shared/access/caller.js';
import type { ListResistorsDto } from './dto/list-resistors.dto.js';
import type { ResistorListDto } from './dto/resistor-response.dto.js';
import { PartUsesService } from './part-uses.service.js';
import { PartsService } from './parts.service.js';

@Injectable()
export class ResistorsService extends PartsService<ResistorPart> {
  constructor(store: ResistorStore, uses: PartUsesService) {
    super(store, uses);
  }

  list(caller: Caller, dto: ListResistorsDto): Promise<ResistorListDto> {
    const { technology, resistanceFrom: from, resistanceTo: to, ...query } = dto;
    return this.listParts(caller, query, { choice: technology, range: { key: 'resistance', from, to } });
  }
}
