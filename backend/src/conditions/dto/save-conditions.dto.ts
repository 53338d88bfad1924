import { RankingRequestDto } from '../../shared/conditions/ranking-request.dto.js';
import { Ids } from '../../shared/validation/id.decorator.js';
import { StoredText } from '../../shared/validation/stored-text.decorator.js';
import { CONDITIONS_NAME, MOST_PARTS } from './conditions-fields.js';

export class SaveConditionsDto extends RankingRequestDto {
  @StoredText(CONDITIONS_NAME)
  name: string;

  /** The parts that are chosen at these conditions. */
  @Ids(MOST_PARTS, { least: 0, optional: true })
  partIds: string[] = [];
}
