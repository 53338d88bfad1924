/** What a link in an e-mail can be for, and for how long it is good. */
export const TOKEN_PURPOSES = {
  'sign-up': { minutes: 24 * 60 },
  'change-address': { minutes: 24 * 60 },
  'reset-password': { minutes: 30 },
} as const;
export type TokenPurpose = keyof typeof TOKEN_PURPOSES;

/** An account that is made when its address is confirmed. */
export interface SignUpDetails {
  name: string;
  teamName: string;
  passwordHash: string;
}

export interface AddressDetails {
  /** The session that asked: the others end with the change. */
  sessionId: number;
}

export type TokenDetails = SignUpDetails | AddressDetails | Record<string, never>;
