import { type Approval, APPROVALS, type Lifecycle, LIFECYCLES } from '@roothertz/common/parts';
import { ValidateBy } from 'class-validator';
import { Id } from '../../shared/validation/id.decorator.js';
import { NestedList } from '../../shared/validation/nested.decorator.js';
import { Option } from '../../shared/validation/option.decorator.js';
import { Version } from '../../shared/validation/version.decorator.js';

/** As many as the longest page of a list holds. */
const MOST_PARTS = 1000;

export class StandingChangeDto {
  @Id()
  id: string;

  @SaysSomething()
  @Version()
  version: number;

  @Option(LIFECYCLES, { optional: true })
  lifecycle?: Lifecycle;

  @Option(APPROVALS, { optional: true })
  approval?: Approval;
}

/** How many parts are to stand from now on: all of them or none. */
export class ChangeStandingsDto {
  @NestedList(() => StandingChangeDto, { most: MOST_PARTS })
  parts: StandingChangeDto[];
}

/** A change that changes nothing is a slip of its sender. */
export function SaysSomething(): PropertyDecorator {
  return ValidateBy({
    name: 'saysSomething',
    validator: {
      validate: (_value, args) => {
        const { lifecycle, approval } = args!.object as Partial<StandingChangeDto>;
        return lifecycle !== undefined || approval !== undefined;
      },
      defaultMessage: () => 'a lifecycle or an approval was expected',
    },
  });
}
