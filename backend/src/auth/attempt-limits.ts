/** From when on something has to wait between attempts. */
export interface AttemptLimit {
  name: string;
  /** Attempts that are heard at once. */
  free: number;
  /** Seconds after those; each further attempt doubles them. */
  firstWait: number;
  longestWait: number;
  /** Whether a success forgets the attempts before it; otherwise only itself doesn't count. */
  clearedBySuccess: boolean;
}

export interface AttemptSubject {
  limit: AttemptLimit;
  /** What is counted: an address of e-mail, of the network, or both. */
  of: string;
}

const SIGN_IN = { name: 'sign-in', free: 5, firstWait: 5, longestWait: 900, clearedBySuccess: true };
const SIGN_IN_ACCOUNT = {
  name: 'sign-in-account',
  free: 50,
  firstWait: 5,
  longestWait: 300,
  clearedBySuccess: true,
};
const SIGN_IN_ADDRESS = {
  name: 'sign-in-address',
  free: 100,
  firstWait: 5,
  longestWait: 900,
  clearedBySuccess: false,
};
const MAIL_TO = { name: 'mail-to', free: 4, firstWait: 60, longestWait: 3600, clearedBySuccess: false };
const MAIL_FROM_ADDRESS = {
  name: 'mail-from-address',
  free: 60,
  firstWait: 60,
  longestWait: 3600,
  clearedBySuccess: false,
};

/** The failures by which guessing a password is slowed: of one account from one place, of the account, of the place. */
export function signInSubjects(email: string, address: string): AttemptSubject[] {
  return [
    { limit: SIGN_IN, of: `${email}|${address}` },
    { limit: SIGN_IN_ACCOUNT, of: email },
    { limit: SIGN_IN_ADDRESS, of: address },
  ];
}

/** What slows the e-mails that strangers can make the server send. */
export function mailSubjects(email: string, address: string): AttemptSubject[] {
  return [
    { limit: MAIL_TO, of: email },
    { limit: MAIL_FROM_ADDRESS, of: address },
  ];
}

/** Seconds to wait after so many attempts. */
export function waitAfter(count: number, { free, firstWait, longestWait }: AttemptLimit): number {
  return count < free ? 0 : Math.min(firstWait * 2 ** Math.min(count - free, 30), longestWait);
}
