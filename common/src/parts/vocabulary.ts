/** Where a part stands in its maker's life cycle. */
export const LIFECYCLES = ['active', 'not-recommended', 'last-time-buy', 'obsolete'] as const;
export type Lifecycle = (typeof LIFECYCLES)[number];

/** Whether the team lets its designers use a part. */
export const APPROVALS = ['approved', 'restricted', 'not-approved'] as const;
export type Approval = (typeof APPROVALS)[number];

/** The technology of an amplifier's input stage. */
export const INPUT_TYPES = ['bipolar', 'jfet', 'cmos', 'zero-drift'] as const;
export type InputType = (typeof INPUT_TYPES)[number];

/** Where the figure of a parameter comes from; it decides how far the figure is trusted. */
export const ORIGINS = ['typical', 'maximum', 'measured', 'estimated'] as const;
export type Origin = (typeof ORIGINS)[number];

/** The library that a part stands in: the shared curated one, or the team's own. */
export const LIBRARIES = ['curated', 'team'] as const;
export type Library = (typeof LIBRARIES)[number];

export const LIFECYCLE_LABELS: Record<Lifecycle, string> = {
  active: 'active',
  'not-recommended': 'not recommended for new designs',
  'last-time-buy': 'last-time buy',
  obsolete: 'obsolete',
};

export const APPROVAL_LABELS: Record<Approval, string> = {
  approved: 'approved',
  restricted: 'restricted',
  'not-approved': 'not approved',
};

export const INPUT_TYPE_LABELS: Record<InputType, string> = {
  bipolar: 'bipolar',
  jfet: 'JFET',
  cmos: 'CMOS',
  'zero-drift': 'zero-drift',
};

export const ORIGIN_LABELS: Record<Origin, string> = {
  typical: 'data sheet, typical',
  maximum: 'data sheet, maximum',
  measured: 'measured',
  estimated: 'estimated',
};
