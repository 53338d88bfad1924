import type { MemberAccess, Role } from '@roothertz/common/access';

/** The signed-in member on whose behalf a request is served: the first argument of every service method. */
export interface Caller extends MemberAccess {
  userId: number;
  teamId: number;
  roles: Role[];
}
