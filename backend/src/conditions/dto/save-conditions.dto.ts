import { RankingRequestDto } from '../../shared/conditions/ranking-request.dto.js';
import { StoredText } from '../../shared/validation/stored-text.decorator.js';
import { CONDITIONS_NAME } from './conditions-name.js';

export class SaveConditionsDto extends RankingRequestDto {
  @StoredText(CONDITIONS_NAME)
  name: string;
}
