/** What can be made to go wrong, as it does on a bad day of the real service. */
export interface Switches {
  /** Every event is delivered twice. */
  duplicate: boolean;
  /** The events of one act are delivered the last first. */
  reverse: boolean;
  /** As many of the next requests are answered with status 500. */
  failNext: number;
}

export const ALL_WELL: Switches = { duplicate: false, reverse: false, failNext: 0 };
