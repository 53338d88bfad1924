import { Id } from '../../shared/validation/id.decorator.js';

/** Two parts that look like one. */
export class PartPairDto {
  @Id()
  oneId: string;

  @Id()
  otherId: string;
}
