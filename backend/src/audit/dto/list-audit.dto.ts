import { AUDIT_ACTIONS, AUDIT_OBJECTS, type AuditAction, type AuditObject } from '@roothertz/common/audit';
import { IntersectionType, PickType } from '@nestjs/swagger';
import { ListQueryDto } from '../../shared/list/list-query.dto.js';
import { Day } from '../../shared/validation/day.decorator.js';
import { Id } from '../../shared/validation/id.decorator.js';
import { Option, Options } from '../../shared/validation/option.decorator.js';
import { Text } from '../../shared/validation/text.decorator.js';

/** What narrows the trail. */
export class AuditFilterDto {
  @Options(Object.keys(AUDIT_ACTIONS), { optional: true, inQuery: true })
  action?: AuditAction[];

  @Option(Object.keys(AUDIT_OBJECTS), { optional: true })
  objectKind?: AuditObject;

  @Text({ label: 'object', maxLength: 40, optional: true })
  objectId?: string;

  @Id({ optional: true })
  userId?: string;

  @Day('from', { optional: true })
  from?: string;

  @Day('to', { optional: true })
  to?: string;
}

/** A page of the trail; the newest entries come first. */
export class ListAuditDto extends IntersectionType(
  AuditFilterDto,
  PickType(ListQueryDto, ['limit', 'offset']),
) {}
