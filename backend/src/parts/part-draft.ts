import {
  type LibraryPart,
  originsOfKnown,
  type Origins,
  type PartCatalogue,
  type PartFields,
} from '@roothertz/common/parts';
import { DomainError } from '../shared/errors/domain-error.js';
import { withFallbacks } from '../shared/parts/parameter-dtos.js';

type Stated = Record<string, unknown>;

/** The part that a request describes, with every default. */
export function newPart<Kind extends LibraryPart>(
  catalogue: PartCatalogue<Kind>,
  dto: PartFields & { origins: Origins },
): Kind {
  const { group, parameters } = catalogue;
  const figures = withFallbacks<Stated>(parameters, parametersOf(group, dto));
  return checked(catalogue, { ...dto, [group]: figures, origins: { ...dto.origins } });
}

/** The part that a change makes of the current one: what it leaves out stays. */
export function changedPart<Kind extends LibraryPart>(
  catalogue: PartCatalogue<Kind>,
  current: Kind,
  { origins, ...change }: Partial<PartFields> & { origins?: Record<string, unknown> },
): Kind {
  const { group } = catalogue;
  return checked(catalogue, {
    ...current,
    ...change,
    [group]: { ...parametersOf(group, current), ...parametersOf(group, change) },
    origins: { ...current.origins, ...origins },
  });
}

/** An origin that is null was taken back. */
function checked<Kind extends LibraryPart>(catalogue: PartCatalogue<Kind>, draft: object): Kind {
  const part = draft as Kind;
  const errors = catalogue.check(part);
  if (errors.length > 0)
    throw new DomainError('part.invalid', 'Some figures of the part contradict each other.', { errors });
  const origins = Object.entries(part.origins).filter(([, origin]) => origin !== null);
  return {
    ...part,
    origins: originsOfKnown(parametersOf(catalogue.group, part), Object.fromEntries(origins)),
  };
}

function parametersOf(group: string, part: object): Stated {
  return (part as Record<string, Stated>)[group];
}
