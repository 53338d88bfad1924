import type { PartFilter } from '@roothertz/common/conditions';
import { APPROVAL_LABELS, INPUT_TYPE_LABELS, LIFECYCLE_LABELS } from '@roothertz/common/parts';

/** A filter in a few words: "approved, active, both libraries". */
export function describeFilter(filter: PartFilter = {}): string {
  const { approval, lifecycle, inputType, library, package: packageName } = filter;
  const words = [
    approval?.map((word) => APPROVAL_LABELS[word]).join(' or '),
    lifecycle?.map((word) => LIFECYCLE_LABELS[word]).join(' or '),
    inputType?.map((word) => INPUT_TYPE_LABELS[word]).join(' or '),
    packageName && `in ${packageName}`,
    describeLibraries(library),
  ];
  return words.filter(Boolean).join(', ');
}

function describeLibraries(library: PartFilter['library']): string {
  if (library?.length !== 1) return 'both libraries';
  return library[0] === 'team' ? 'own list' : 'curated library';
}
