import type {
  FieldError,
  LibraryPart,
  ListedFields,
  PartCatalogue,
  QuantityField,
} from '@roothertz/common/parts';
import type { Figures, PartsApi, PartsReader, StoredPart } from '../../api/parts';
import { partOf, type PartDraft } from './partDraft';

/** How the pages speak of a kind of part, and where they stand. */
interface KindWords {
  /** The list's address; the parts stand below it. */
  path: string;
  /** Such as `op-amp`. */
  noun: string;
  /** The noun where it stands alone, such as `Op-amp`. */
  title: string;
  /** The choice of words among the parameters, with its short heading. */
  choice: { key: 'inputType' | 'technology'; label: string };
  parametersTitle: string;
  /** What one may type into its form. */
  inputExamples: string;
  /** Pixels that the list's columns of part numbers and of the choice need. */
  columnWidths: { part: number; choice: number };
  /** The figure that a ranking misses most where nobody knows it. */
  mostMissed: { key: string; label: string };
  /** The parameter that the list can be narrowed by, from one value to another. */
  narrowedBy: QuantityField | null;
  /** What a part is, in a few words. */
  summary: (figures: Figures) => string[];
}

/** All that the pages know of a kind of part; everything else they make from its catalogue. */
export interface KindOfPart<Stored extends StoredPart = StoredPart> extends KindWords {
  catalogue: ListedFields;
  reader: PartsReader<Stored>;
  /** What is wrong between the figures of a complete draft. */
  check: (draft: PartDraft) => FieldError[];
  create: (draft: PartDraft) => Promise<Stored>;
  update: (base: Pick<StoredPart, 'id' | 'version'>, draft: PartDraft) => Promise<Stored>;
}

export function kindOfPart<Part extends LibraryPart, Stored extends StoredPart>(
  catalogue: PartCatalogue<Part>,
  api: PartsApi<Part, Stored>,
  words: KindWords,
): KindOfPart<Stored> {
  const complete = (draft: PartDraft) => partOf<Part>(catalogue, draft);
  return {
    ...words,
    catalogue,
    reader: api,
    check: (draft) => catalogue.check(complete(draft)),
    create: (draft) => api.create(complete(draft)),
    update: ({ id, version }, draft) => api.update(id, version, complete(draft)),
  };
}
