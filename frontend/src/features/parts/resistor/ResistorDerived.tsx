import { excessNoiseRms, PARAMETER_TEMPERATURE, thermalVoltageDensity } from '@roothertz/common/noise';
import type { Resistor } from '@roothertz/common/parts';
import { Facts } from '../../../components/Facts';
import { Figure, Unknown } from '../../../components/Figure';
import { CautionList } from '../CautionList';
import { DecadeTable } from './DecadeTable';
import { resistorCautions } from './resistorCautions';

/** What follows from a resistor's figures, and what its gaps mean. */
export function ResistorDerived({ resistor }: { resistor: Resistor }) {
  const { resistance, noiseIndex } = resistor;
  const entries = [
    {
      term: <span title="√(4·k·T·R)">thermal noise density at 25 °C</span>,
      value: (
        <Figure value={thermalVoltageDensity(resistance, PARAMETER_TEMPERATURE)} kind="voltageNoiseDensity" />
      ),
    },
    {
      term: <span title="10^(NI/20) µV per volt">excess noise per volt and decade</span>,
      value:
        noiseIndex === null ? (
          <Unknown />
        ) : (
          <>
            <Figure value={excessNoiseRms(noiseIndex, 1, 1, 10)} kind="voltage" />
            /V
          </>
        ),
    },
  ];
  return (
    <>
      <Facts label="Derived figures" entries={entries} />
      <DecadeTable resistor={resistor} />
      <CautionList cautions={resistorCautions(resistor)} />
    </>
  );
}
