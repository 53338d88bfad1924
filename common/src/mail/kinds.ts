interface MailKindRule {
  /** What the messages are about, in the list of a member's preferences. */
  label: string;
  /** A notice, which a member may refuse; the others are part of an act and always sent. */
  notice: boolean;
}

/** Every kind of e-mail that the product sends. */
export const MAIL_KINDS = {
  'confirm-address': { label: 'confirmation of an address', notice: false },
  'account-exists': { label: 'sign-up with an address that has an account', notice: false },
  'reset-password': { label: 'new password', notice: false },
  'address-changed': { label: 'change of the address', notice: false },
  'password-changed': { label: 'change of the password', notice: false },
  invitation: { label: 'invitation to a team', notice: false },
  'payment-failed': { label: 'payment that failed', notice: false },
  'price-digest': { label: 'Weekly list of stale and expiring prices', notice: true },
  'part-notice': { label: 'Parts in saved conditions that change', notice: true },
} as const satisfies Record<string, MailKindRule>;

export type MailKind = keyof typeof MAIL_KINDS;
export type NoticeKind = {
  [Kind in MailKind]: (typeof MAIL_KINDS)[Kind]['notice'] extends true ? Kind : never;
}[MailKind];

export const NOTICE_KINDS = (Object.keys(MAIL_KINDS) as MailKind[]).filter(isNotice);

/** Whether a member may refuse messages of this kind. */
export function isNotice(kind: string): kind is NoticeKind {
  return kind in MAIL_KINDS && MAIL_KINDS[kind as MailKind].notice;
}
