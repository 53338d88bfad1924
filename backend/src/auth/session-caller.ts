import type { Caller } from '../shared/access/caller.js';

/** A caller, and the session by which the request came. */
export interface SessionCaller extends Caller {
  sessionId: number;
}
