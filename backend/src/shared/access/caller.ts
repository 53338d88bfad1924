import type { Plan, Role } from '@roothertz/common/access';

/** The signed-in member on whose behalf a request is served: the first argument of every service method. */
export interface Caller {
  userId: number;
  teamId: number;
  roles: Role[];
  plan: Plan;
}
