import { type Role, ROLE_LABELS } from '@roothertz/common/access';
import type { Letter } from '../../mail/letter.js';
import { dayText } from '../../shared/text/day-text.js';

interface Invited {
  teamName: string;
  by: string;
  roles: readonly Role[];
  token: string;
  expiresAt: Date;
}

/** What an invited person reads. */
export function invitationLetter({ teamName, by, roles, token, expiresAt }: Invited): Letter {
  return {
    subject: `${by} invites you to ${teamName} on Roothertz`,
    paragraphs: [
      `${by} invites you to the team ${teamName} on Roothertz, as ${roles.map((role) => ROLE_LABELS[role]).join(', ')}.`,
      `The invitation is for this address and good until ${dayText(expiresAt)}.`,
    ],
    link: { label: 'Join the team', path: `/invitations/${token}` },
    remark: 'If you don’t know the sender, do nothing: without your consent nobody joins a team.',
  };
}
