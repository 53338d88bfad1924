import type { Amplifier } from '@roothertz/common/parts';
import { Facts } from '../../../components/Facts';
import { Figure } from '../../../components/Figure';
import { CautionList } from '../CautionList';
import { derivedFigures } from './derivedFigures';
import { opAmpCautions } from './opAmpCautions';

/** What follows from an amplifier's figures, and what its gaps mean. */
export function OpAmpDerived({ amplifier }: { amplifier: Amplifier }) {
  const entries = derivedFigures(amplifier).map(({ label, help, kind, value }) => ({
    term: <span title={help}>{label}</span>,
    value: <Figure value={value} kind={kind} />,
  }));
  return (
    <>
      <Facts label="Derived figures" entries={entries} />
      <CautionList cautions={opAmpCautions(amplifier)} />
    </>
  );
}
