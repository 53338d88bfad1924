import { RESISTOR_CATALOGUE, RESISTOR_PARAMETERS, TECHNOLOGY_FIELD } from '@roothertz/common/parts';
import { formatEditable } from '@roothertz/common/units';
import type { Figures } from '../../api/parts';
import { RESISTORS_API } from '../../api/resistors';
import { kindOfPart } from './kindOfPart';
import { optionLabel } from '../../components/optionLabels';
import { figureOf } from './partDraft';

export const RESISTORS = kindOfPart(RESISTOR_CATALOGUE, RESISTORS_API, {
  path: '/parts/resistors',
  noun: 'resistor',
  title: 'Resistor',
  choice: { key: TECHNOLOGY_FIELD.key, label: 'Technology' },
  parametersTitle: 'Parameters',
  inputExamples: '4k7, 0.1 %, 25 ppm/K or −20 dB',
  columnWidths: { part: 134, choice: 150 },
  mostMissed: { key: 'noiseIndex', label: 'noise index' },
  narrowedBy: RESISTOR_PARAMETERS[0],
  summary: resistorSummary,
});

function resistorSummary(figures: Figures): string[] {
  const tolerance = figureOf(figures, 'tolerance');
  const value = formatEditable(figureOf(figures, 'resistance')!, 'resistance');
  const { technology } = figures;
  return [
    tolerance === null ? value : `${value} ±${formatEditable(tolerance, 'fraction')}`,
    ...(technology === null ? [] : [optionLabel('technology', String(technology))]),
  ];
}
