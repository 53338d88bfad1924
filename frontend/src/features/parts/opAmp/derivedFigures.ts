import { leastCurrentNoise, PARAMETER_TEMPERATURE, thermalPowerDensity } from '@roothertz/common/noise';
import type { Amplifier } from '@roothertz/common/parts';
import type { QuantityKind } from '@roothertz/common/units';

interface DerivedFigure {
  label: string;
  help: string;
  kind: QuantityKind;
  value: number | null;
}

/** What follows from an amplifier's figures, whatever the stage. */
export function derivedFigures(amplifier: Amplifier): DerivedFigure[] {
  const { voltageNoise, currentNoise, inputBiasCurrent, inputType } = amplifier;
  return [
    {
      label: 'optimum source resistance',
      help: 'e_n / i_n: where the amplifier adds least to the source’s own noise.',
      kind: 'resistance',
      value: currentNoise ? voltageNoise / currentNoise : null,
    },
    {
      label: 'equivalent noise resistance',
      help: 'The resistor that makes the same voltage noise at 25 °C.',
      kind: 'resistance',
      value: voltageNoise ** 2 / thermalPowerDensity(PARAMETER_TEMPERATURE),
    },
    {
      label: 'shot noise of the bias current',
      help: '√(2·q·I_b): the current noise is not below it unless the input is bias-cancelled.',
      kind: 'currentNoiseDensity',
      value: inputBiasCurrent === null ? null : leastCurrentNoise(inputType, inputBiasCurrent),
    },
  ];
}
