import type { Amplifier } from '@roothertz/common/parts';
import { Facts } from '../../components/Facts';
import { Figure } from '../../components/Figure';
import { derivedFigures } from './derivedFigures';
import { partCautions } from './partCautions';
import styles from './PartDerived.module.css';

/** What follows from a part's figures, and what its gaps mean. */
export function PartDerived({ amplifier }: { amplifier: Amplifier }) {
  const cautions = partCautions(amplifier);
  const entries = derivedFigures(amplifier).map(({ label, help, kind, value }) => ({
    term: <span title={help}>{label}</span>,
    value: <Figure value={value} kind={kind} />,
  }));
  return (
    <>
      <Facts label="Derived figures" entries={entries} />
      {cautions.length > 0 && (
        <ul className={styles.cautions} aria-label="Cautions">
          {cautions.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      )}
    </>
  );
}
