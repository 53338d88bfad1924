import type { Invitation, TeamMember } from '../api/team';

/** Two admins, one of whom is signed in and holds the plan, and an engineer. */
export const MEMBERS: TeamMember[] = [
  {
    id: '7',
    name: 'Ada Merrow',
    email: 'admin@tarnfield.example',
    roles: ['admin'],
    isOwner: true,
    joinedAt: '2026-01-05T10:00:00.000Z',
  },
  {
    id: '8',
    name: 'Tobias Fenn',
    email: 'tobias@tarnfield.example',
    roles: ['admin', 'librarian'],
    isOwner: false,
    joinedAt: '2026-02-05T10:00:00.000Z',
  },
  {
    id: '9',
    name: 'Jonas Hartwell',
    email: 'jonas@tarnfield.example',
    roles: ['engineer'],
    isOwner: false,
    joinedAt: '2026-03-05T10:00:00.000Z',
  },
];

export const INVITATION: Invitation = {
  id: '3',
  email: 'nell@weir.example',
  roles: ['reviewer'],
  invitedBy: { id: '7', name: 'Ada Merrow' },
  sentAt: '2026-11-30T10:00:00.000Z',
  expiresAt: '2199-12-07T10:00:00.000Z',
};
