/** Characters that an e-mail address has at most. */
export const ADDRESS_MOST = 254;

const ADDRESS = /^[^\s@<>"(),:;\\[\]\p{C}]{1,64}@[a-z0-9-]+(\.[a-z0-9-]+)*\.[a-z]{2,}$/iu;

/**
 * What keeps a text from being an e-mail address that messages are sent to, as a sentence; null = nothing. Spaces at its
 * ends are the caller's to take away. Whether the mailbox exists nobody knows before a message has come there.
 *
 * @example addressFault('nobody') // 'An address such as name@company.example is needed.'
 */
export function addressFault(address: string): string | null {
  const isAddress = address.length <= ADDRESS_MOST && ADDRESS.test(address);
  return isAddress ? null : 'An address such as name@company.example is needed.';
}
