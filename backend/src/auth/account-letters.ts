import type { Letter } from '../mail/letter.js';

const NOT_YOU = 'If it wasn’t you, you need do nothing: without this link nothing happens.';
const TELL_ADMIN = 'If it wasn’t you, set a new password at once: use “Forgotten?” below the password.';

export function confirmSignUpLetter(name: string, token: string): Letter {
  return {
    subject: 'Confirm your address for Roothertz',
    paragraphs: [
      `Hello ${name},`,
      'somebody, most likely you, has signed up for Roothertz with this address. Confirm it, and the account is yours.',
    ],
    link: { label: 'Confirm the address', path: `/confirm/${token}` },
    remark: `The link is good for a day, once. ${NOT_YOU}`,
  };
}

export function accountExistsLetter(): Letter {
  return {
    subject: 'You have a Roothertz account already',
    paragraphs: [
      'Somebody, most likely you, has asked for a Roothertz account with this address. There is one already, and nothing has changed.',
      'Sign in as always; if you don’t know the password any more, use “Forgotten?” below it.',
    ],
    link: { label: 'Sign in', path: '/sign-in' },
    remark: 'If it wasn’t you, you need do nothing.',
  };
}

export function resetPasswordLetter(name: string, token: string): Letter {
  return {
    subject: 'A new password for Roothertz',
    paragraphs: [
      `Hello ${name},`,
      'somebody, most likely you, wants to set a new password for your account. It ends all sessions that are open.',
    ],
    link: { label: 'Set a new password', path: `/reset-password/${token}` },
    remark: `The link is good for 30 minutes, once. ${NOT_YOU}`,
  };
}

export function confirmAddressLetter(name: string, token: string): Letter {
  return {
    subject: 'Confirm your new address for Roothertz',
    paragraphs: [
      `Hello ${name},`,
      'this is to become the address of your Roothertz account. Until you confirm it, the old one stays.',
    ],
    link: { label: 'Confirm the address', path: `/confirm/${token}` },
    remark: `The link is good for a day, once. ${NOT_YOU}`,
  };
}

export function addressChangedLetter(name: string, newAddress: string): Letter {
  return {
    subject: 'Your Roothertz account has another address',
    paragraphs: [
      `Hello ${name},`,
      `your account now belongs to ${newAddress}. You sign in with that address; this one has no account any more.`,
    ],
    remark: 'If it wasn’t you, tell an admin of your team at once.',
  };
}

export function passwordChangedLetter(name: string): Letter {
  return {
    subject: 'Your Roothertz password was changed',
    paragraphs: [
      `Hello ${name},`,
      'the password of your account was changed, and your other sessions were ended.',
    ],
    link: { label: 'Sign in', path: '/sign-in' },
    remark: TELL_ADMIN,
  };
}
