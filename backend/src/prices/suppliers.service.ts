import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager, In } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { duplicateAs } from '../shared/errors/duplicate-entry.js';
import { likePattern } from '../shared/list/like-pattern.js';
import type { ListQueryDto } from '../shared/list/list-query.dto.js';
import { parseSort } from '../shared/list/sort.js';
import { nameKey } from '../shared/text/name-key.js';
import {
  type CreateSupplierDto,
  type SupplierListDto,
  type SupplierResponseDto,
  toSupplierResponse,
} from './dto/supplier.dto.js';
import { Offer } from './entities/offer.entity.js';
import { Supplier } from './entities/supplier.entity.js';

const SORTS = ['name'] as const;

const refuseDuplicate = duplicateAs('supplier.duplicate', 'The team has a supplier of this name already.', [
  { field: 'name', message: 'name: another one was expected, for this one is taken' },
]);

@Injectable()
export class SuppliersService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly audit: AuditService,
  ) {}

  async list({ teamId }: Caller, query: ListQueryDto): Promise<SupplierListDto> {
    const { descending } = parseSort(query.sort ?? 'name', SORTS);
    const [items, total] = await this.dataSource.manager
      .createQueryBuilder(Supplier, 'supplier')
      .where('supplier.teamId = :teamId', { teamId })
      .andWhere(`supplier.name LIKE :name ESCAPE '!'`, { name: likePattern(query.search ?? '') })
      .orderBy('supplier.name', descending ? 'DESC' : 'ASC')
      .addOrderBy('supplier.id')
      .limit(query.limit)
      .offset(query.offset)
      .getManyAndCount();
    const currencies = await this.lastCurrencies(
      teamId,
      items.map(({ id }) => id),
    );
    const listed = items.map((item) => ({
      ...toSupplierResponse(item),
      currency: currencies.get(item.id) ?? null,
    }));
    return { items: listed, total };
  }

  create(caller: Caller, { name }: CreateSupplierDto): Promise<SupplierResponseDto> {
    return this.dataSource
      .transaction((manager) => this.add(manager, caller, name))
      .then(toSupplierResponse)
      .catch(refuseDuplicate);
  }

  /** All suppliers of a team by the keys of their names. */
  async byNameKey(
    manager: EntityManager,
    { teamId }: Pick<Caller, 'teamId'>,
  ): Promise<Map<string, Pick<Supplier, 'id' | 'name'>>> {
    const suppliers = await manager.findBy(Supplier, { teamId });
    return new Map(suppliers.map(({ id, name, nameKey: key }) => [key, { id, name }]));
  }

  /** The currency of the offer that each of a team's suppliers made last. */
  private async lastCurrencies(teamId: number, supplierIds: readonly number[]): Promise<Map<number, string>> {
    if (supplierIds.length === 0) return new Map();
    const { manager } = this.dataSource;
    const last = await manager
      .createQueryBuilder(Offer, 'offer')
      .select('MAX(offer.id)', 'id')
      .where('offer.teamId = :teamId AND offer.supplierId IN (:...supplierIds)', { teamId, supplierIds })
      .groupBy('offer.supplierId')
      .getRawMany<{ id: number }>();
    const offers = await manager.find(Offer, {
      where: { teamId, id: In(last.map(({ id }) => id)) },
      select: { id: true, supplierId: true, currency: true },
    });
    return new Map(offers.map(({ supplierId, currency }) => [supplierId, currency]));
  }

  async add(manager: EntityManager, caller: Caller, name: string): Promise<Pick<Supplier, 'id' | 'name'>> {
    const row = { teamId: caller.teamId, name, nameKey: nameKey(name), createdAt: new Date() };
    const { identifiers } = await manager.insert(Supplier, row);
    const id = identifiers[0].id as number;
    const object = { kind: 'supplier', id, label: name } as const;
    await this.audit.record(manager, caller, [
      { action: 'supplier.added', object, from: null, to: { name } },
    ]);
    return { id, name };
  }
}
