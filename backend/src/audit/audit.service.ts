import { addDays } from '@roothertz/common/prices';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import type { AuditAction, AuditObject } from './audit-actions.js';
import { type AuditListDto, toAuditEntryResponse } from './dto/audit-response.dto.js';
import type { ListAuditDto } from './dto/list-audit.dto.js';
import { AuditEntry } from './entities/audit-entry.entity.js';

/** What somebody did to an object; null = nothing stood before, or stands since. */
export interface Recorded {
  action: AuditAction;
  object: { kind: AuditObject; id: number | string };
  from: object | null;
  to: object | null;
}

/** Whose act it was; null = nobody's of the team: the payment service told it. */
export interface Actor {
  teamId: number;
  userId: number | null;
}

const CHUNK = 500;

/** The trail of who changed what: entries are only ever added, in the transaction of the change itself. */
@Injectable()
export class AuditService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async record(manager: EntityManager, { teamId, userId }: Actor, done: readonly Recorded[]): Promise<void> {
    const at = new Date();
    const rows = done.map(({ action, object: { kind, id }, from, to }) => ({
      teamId,
      userId,
      at,
      action,
      objectKind: kind,
      objectId: String(id),
      from,
      to,
    }));
    for (let start = 0; start < rows.length; start += CHUNK)
      await manager.insert(AuditEntry, rows.slice(start, start + CHUNK));
  }

  async list({ teamId }: Caller, query: ListAuditDto): Promise<AuditListDto> {
    const { action, objectKind, objectId, userId, from, to } = query;
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
    const [items, total] = await select
      .orderBy('entry.id', 'DESC')
      .limit(query.limit)
      .offset(query.offset)
      .getManyAndCount();
    return { items: items.map(toAuditEntryResponse), total };
  }
}
