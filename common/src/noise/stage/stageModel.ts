import type { OperatingConditions } from '../../conditions/index.js';
import { differenceModel } from './difference.js';
import { instrumentationModel } from './instrumentation.js';
import { invertingModel } from './inverting.js';
import type { StageModel } from './model.js';
import { nonInvertingModel } from './nonInverting.js';
import { transimpedanceModel } from './transimpedance.js';

const MODELS = {
  'non-inverting': nonInvertingModel,
  inverting: invertingModel,
  transimpedance: transimpedanceModel,
  difference: differenceModel,
  instrumentation: instrumentationModel,
};

/** The transfers of the conditions' topology. */
export function stageModel(conditions: OperatingConditions): StageModel {
  return MODELS[conditions.stage.topology](conditions);
}
