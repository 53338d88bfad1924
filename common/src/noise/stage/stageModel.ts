import type { OperatingConditions } from '../../conditions/index.js';
import { invertingModel } from './inverting.js';
import type { StageModel } from './model.js';
import { nonInvertingModel } from './nonInverting.js';
import { transimpedanceModel } from './transimpedance.js';

const MODELS = {
  'non-inverting': nonInvertingModel,
  inverting: invertingModel,
  transimpedance: transimpedanceModel,
};

/** The transfers of the conditions' topology. */
export function stageModel(conditions: OperatingConditions): StageModel {
  return MODELS[conditions.stage.topology](conditions);
}
