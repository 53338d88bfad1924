import { Injectable } from '@nestjs/common';
import { OpAmpStore } from '../library/op-amp-store.service.js';
import { OP_AMP_SORTS } from '../library/op-amp-select.js';
import type { Caller } from '../shared/access/caller.js';
import { readId } from '../shared/ids/read-id.js';
import { parseSort } from '../shared/list/sort.js';
import type { CreateOpAmpDto } from './dto/create-op-amp.dto.js';
import type { ListOpAmpsDto } from './dto/list-op-amps.dto.js';
import { type OpAmpListDto, type OpAmpResponseDto, toOpAmpResponse } from './dto/op-amp-response.dto.js';
import type { UpdateOpAmpDto } from './dto/update-op-amp.dto.js';
import { changedOpAmp, newOpAmp } from './op-amp-draft.js';

@Injectable()
export class OpAmpsService {
  constructor(private readonly store: OpAmpStore) {}

  async list(caller: Caller, query: ListOpAmpsDto): Promise<OpAmpListDto> {
    const sort = parseSort(query.sort ?? 'manufacturer', OP_AMP_SORTS);
    const { items, total } = await this.store.list(caller, { ...query, sort });
    return { items: items.map(toOpAmpResponse), total };
  }

  async find(caller: Caller, id: string): Promise<OpAmpResponseDto> {
    return toOpAmpResponse(await this.store.find(caller, readId(id)));
  }

  async create(caller: Caller, dto: CreateOpAmpDto): Promise<OpAmpResponseDto> {
    return toOpAmpResponse(await this.store.insert(caller, newOpAmp(dto)));
  }

  async update(caller: Caller, id: string, dto: UpdateOpAmpDto): Promise<OpAmpResponseDto> {
    const change = (current: Parameters<typeof changedOpAmp>[0]) => changedOpAmp(current, dto);
    return toOpAmpResponse(await this.store.update(caller, readId(id), dto.version, change));
  }

  remove(caller: Caller, id: string, version: number): Promise<void> {
    return this.store.remove(caller, readId(id), version);
  }
}
