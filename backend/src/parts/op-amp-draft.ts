import { type AmplifierOrigins, checkOpAmp, type OpAmpPart, originsOfKnown } from '@roothertz/common/parts';
import { DomainError } from '../shared/errors/domain-error.js';
import { toAmplifier } from '../shared/op-amps/amplifier.dto.js';
import type { CreateOpAmpDto } from './dto/create-op-amp.dto.js';
import type { UpdateOpAmpDto } from './dto/update-op-amp.dto.js';

/** The op-amp that a request describes, with every default. */
export function newOpAmp({ amplifier, ...dto }: CreateOpAmpDto): OpAmpPart {
  return checked({ ...dto, amplifier: toAmplifier(amplifier), origins: { ...dto.origins } });
}

/** The op-amp that a change makes of the current one. */
export function changedOpAmp(current: OpAmpPart, change: UpdateOpAmpDto): OpAmpPart {
  const { version: _, amplifier, origins, ...fields } = change;
  return checked({
    ...current,
    ...fields,
    amplifier: { ...current.amplifier, ...amplifier },
    origins: stated({ ...current.origins, ...origins }),
  });
}

function stated(origins: Record<string, string | null>): AmplifierOrigins {
  return Object.fromEntries(Object.entries(origins).filter(([, origin]) => origin !== null));
}

function checked(part: OpAmpPart): OpAmpPart {
  const errors = checkOpAmp(part);
  if (errors.length > 0)
    throw new DomainError('part.invalid', 'Some figures of the part contradict each other.', { errors });
  return { ...part, origins: originsOfKnown(part.amplifier, part.origins) };
}
