import { Type } from 'class-transformer';
import { Version } from '../validation/version.decorator.js';

/** What a deletion takes. */
export class VersionQueryDto {
  @Type(() => Number)
  @Version()
  version: number;
}
