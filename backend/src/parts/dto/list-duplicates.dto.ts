import { PickType } from '@nestjs/swagger';
import { ListQueryDto } from '../../shared/list/list-query.dto.js';

/** A page of the pairs, the likeliest first. */
export class ListDuplicatesDto extends PickType(ListQueryDto, ['limit', 'offset']) {}
