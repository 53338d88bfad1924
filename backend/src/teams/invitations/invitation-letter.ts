import { type Role, ROLE_LABELS } from '@roothertz/common/access';
import type { Letter } from '../../mail/letter.js';

interface Invited {
  teamName: string;
  by: string;
  roles: readonly Role[];
  token: string;
  expiresAt: Date;
}

const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/** What an invited person reads. */
export function invitationLetter({ teamName, by, roles, token, expiresAt }: Invited): Letter {
  return {
    subject: `${by} invites you to ${teamName} on Roothertz`,
    paragraphs: [
      `${by} invites you to the team ${teamName} on Roothertz, as ${roles.map((role) => ROLE_LABELS[role]).join(', ')}.`,
      `The invitation is for this address and good until ${DAY.format(expiresAt)}.`,
    ],
    link: { label: 'Join the team', path: `/invitations/${token}` },
    remark: 'If you don’t know the sender, do nothing: without your consent nobody joins a team.',
  };
}
