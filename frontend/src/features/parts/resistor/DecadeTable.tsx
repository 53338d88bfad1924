import type { Resistor } from '@roothertz/common/parts';
import { formatQuantity, type QuantityKind } from '@roothertz/common/units';
import { Figure } from '../../../components/Figure';
import styles from './DecadeTable.module.css';
import { DECADE, resistorAt, type ResistorAt } from './resistorAt';

const VOLTAGES = [1, 10];

interface Line {
  label: string;
  kind: QuantityKind;
  valueOf: (at: ResistorAt) => number | null;
}

const LINES: readonly Line[] = [
  { label: 'thermal noise', kind: 'voltage', valueOf: ({ thermalRms }) => thermalRms },
  { label: 'excess noise', kind: 'voltage', valueOf: ({ excessRms }) => excessRms },
  {
    label: 'total above thermal',
    kind: 'decibel',
    valueOf: ({ excessRms, aboveThermal }) => (excessRms === null ? null : aboveThermal),
  },
  { label: 'excess equals thermal at', kind: 'frequency', valueOf: ({ crossover }) => crossover },
];

/** What usual direct voltages would make of a resistor over one decade. */
export function DecadeTable({ resistor }: { resistor: Resistor }) {
  const places = VOLTAGES.map((dcVoltage) => resistorAt(resistor, dcVoltage));
  const [from, to] = [DECADE.lower, DECADE.upper].map((end) =>
    formatQuantity(end, 'frequency', { trim: true }),
  );
  return (
    <table className={styles.table}>
      <caption>
        Over the decade from {from} to {to}
      </caption>
      <thead>
        <tr>
          <td />
          {places.map(({ dcVoltage }) => (
            <th key={dcVoltage} scope="col">
              at {formatQuantity(dcVoltage, 'voltage', { trim: true })}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {LINES.map(({ label, kind, valueOf }) => (
          <tr key={label}>
            <th scope="row">{label}</th>
            {places.map((at) => (
              <td key={at.dcVoltage}>{at.isOverRating ? '–' : <Figure value={valueOf(at)} kind={kind} />}</td>
            ))}
          </tr>
        ))}
        <tr>
          <th scope="row">dissipation</th>
          {places.map((at) => (
            <td key={at.dcVoltage} className={at.isOverRating ? styles.over : undefined}>
              <Figure value={at.dissipation} kind="power" />
              {at.isOverRating && ', over its rating'}
            </td>
          ))}
        </tr>
      </tbody>
    </table>
  );
}
