import { INPUT_TYPE_FIELD, OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import { OP_AMPS_API } from '../../api/opAmps';
import { kindOfPart } from './kindOfPart';
import { optionLabel } from '../../components/optionLabels';

export const OP_AMPS = kindOfPart(OP_AMP_CATALOGUE, OP_AMPS_API, {
  path: '/parts',
  noun: 'op-amp',
  title: 'Op-amp',
  choice: { key: INPUT_TYPE_FIELD.key, label: 'Input' },
  parametersTitle: 'Parameters of one amplifier',
  inputExamples: '4.7 pF, 1.1 nV/√Hz or 10 MHz',
  columnWidths: { part: 112, choice: 88 },
  mostMissed: { key: 'currentNoise', label: 'current noise' },
  narrowedBy: null,
  summary: ({ inputType }) =>
    inputType === null ? [] : [`${optionLabel('inputType', String(inputType))} input`],
});
