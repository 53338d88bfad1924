import { OpAmpDensity } from '../../features/parts/opAmp/OpAmpDensity';
import { OpAmpDerived } from '../../features/parts/opAmp/OpAmpDerived';
import { OP_AMPS } from '../../features/parts/opAmps';
import { PartPage } from './PartPage';

export function OpAmpPage() {
  return (
    <PartPage
      kind={OP_AMPS}
      density={(part) => <OpAmpDensity part={part} />}
      derived={({ amplifier }) => <OpAmpDerived amplifier={amplifier} />}
    />
  );
}
