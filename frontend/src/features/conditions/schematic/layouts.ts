import type { StageKind } from '../stageKind';
import { DIFFERENCE_LAYOUT } from './differenceLayout';
import { INSTRUMENTATION_LAYOUT } from './instrumentationLayout';
import { INVERTING_LAYOUT } from './invertingLayout';
import type { SchematicLayout } from './layout';
import { FOLLOWER_LAYOUT, NON_INVERTING_LAYOUT } from './nonInvertingLayout';
import { TRANSIMPEDANCE_LAYOUT } from './transimpedanceLayout';

export const LAYOUTS: Record<StageKind, SchematicLayout> = {
  'non-inverting': NON_INVERTING_LAYOUT,
  follower: FOLLOWER_LAYOUT,
  inverting: INVERTING_LAYOUT,
  transimpedance: TRANSIMPEDANCE_LAYOUT,
  difference: DIFFERENCE_LAYOUT,
  instrumentation: INSTRUMENTATION_LAYOUT,
};
