import type { AuditAction, AuditObject } from '@roothertz/common/audit';
import { addDays } from '@roothertz/common/prices';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import type { WrittenList } from '../shared/csv/csv-lines.js';
import { shortened } from '../shared/text/shortened.js';
import { auditPieces } from './audit-list.js';
import { type AuditListDto, toAuditEntryResponse } from './dto/audit-response.dto.js';
import type { AuditFilterDto, ListAuditDto } from './dto/list-audit.dto.js';
import { AuditEntry } from './entities/audit-entry.entity.js';

/** What somebody did to an object; null = nothing stood before, or stands since. */
export interface Recorded {
  action: AuditAction;
  /** The label is what people call it. */
  object: { kind: AuditObject; id: number | string; label?: string };
  from: object | null;
  to: object | null;
}

/** Whose act it was; null = nobody's of the team: the payment service told it. */
export interface Actor {
  teamId: number;
  userId: number | null;
}

const CHUNK = 500;
const LONGEST_LABEL = 250;

/** The trail of who changed what: entries are only ever added, in the transaction of the change itself. */
@Injectable()
export class AuditService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async record(manager: EntityManager, { teamId, userId }: Actor, done: readonly Recorded[]): Promise<void> {
    const at = new Date();
    const rows = done.map(({ action, object: { kind, id, label }, from, to }) => ({
      teamId,
      userId,
      at,
      action,
      objectKind: kind,
      objectId: String(id),
      objectLabel: label === undefined ? null : shortened(label, LONGEST_LABEL),
      from,
      to,
    }));
    for (let start = 0; start < rows.length; start += CHUNK)
      await manager.insert(AuditEntry, rows.slice(start, start + CHUNK));
  }

  async list(caller: Caller, query: ListAuditDto): Promise<AuditListDto> {
    const [items, total] = await this.select(caller, query)
      .limit(query.limit)
      .offset(query.offset)
      .getManyAndCount();
    return { items: items.map(toAuditEntryResponse), total };
  }

  /** All that the filter leaves, as a list for a spreadsheet. */
  export(caller: Caller, filter: AuditFilterDto): WrittenList {
    const pieces = auditPieces((last, portion) => {
      const select = this.select(caller, filter).limit(portion);
      return (last === null ? select : select.andWhere('entry.id < :last', { last })).getMany();
    });
    return { name: 'audit-trail.csv', pieces };
  }

  private select({ teamId }: Caller, filter: AuditFilterDto): SelectQueryBuilder<AuditEntry> {
    const { action, objectKind, objectId, userId, from, to } = filter;
    const select = this.dataSource.manager
      .createQueryBuilder(AuditEntry, 'entry')
      .leftJoin('entry.user', 'user')
      .addSelect(['user.id', 'user.name'])
      .where('entry.teamId = :teamId', { teamId });
    if (action?.length) select.andWhere('entry.action IN (:...action)', { action });
    if (objectKind) select.andWhere('entry.objectKind = :objectKind', { objectKind });
    if (objectId) select.andWhere('entry.objectId = :objectId', { objectId });
    if (userId) select.andWhere('entry.userId = :userId', { userId });
    if (from) select.andWhere('entry.at >= :from', { from: new Date(from) });
    if (to) select.andWhere('entry.at < :end', { end: new Date(addDays(to, 1)) });
    return select.orderBy('entry.id', 'DESC');
  }
}
