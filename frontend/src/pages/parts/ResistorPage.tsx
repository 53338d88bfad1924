import { ResistorDensity } from '../../features/parts/resistor/ResistorDensity';
import { ResistorDerived } from '../../features/parts/resistor/ResistorDerived';
import { RESISTORS } from '../../features/parts/resistors';
import { PartPage } from './PartPage';

export function ResistorPage() {
  return (
    <PartPage
      kind={RESISTORS}
      density={(part) => <ResistorDensity part={part} />}
      derived={({ resistor }) => <ResistorDerived resistor={resistor} />}
    />
  );
}
