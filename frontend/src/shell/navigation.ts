import type { Action } from '@roothertz/common/access';

interface NavigationEntry {
  to: string;
  label: string;
  action: Action;
}

/** The pages of the rail, each with the action that a member must be allowed to see it. */
export const NAVIGATION: readonly NavigationEntry[] = [
  { to: '/rank', label: 'Rank', action: 'rankings.run' },
  { to: '/parts', label: 'Parts', action: 'parts.read' },
  { to: '/imports', label: 'Import', action: 'lists.import' },
  { to: '/prices', label: 'Prices', action: 'prices.read' },
  { to: '/team', label: 'Team', action: 'team.read' },
];

export const START_PAGE = '/rank';
