import type { PlanPoint } from '@/lib/room';
import type { Outcome } from '../outcome';
import type { Guide, SnapReach } from '../snapping';

/** Where the pointer is and how it is held. */
export interface Pull extends SnapReach {
  readonly at: PlanPoint;
  /** Shift: fine steps, or the same proportions. */
  readonly shift: boolean;
}

/** What a pull makes of the plan as it was when the hand took hold. */
export interface Pulled {
  readonly outcome: Outcome;
  readonly guides: readonly Guide[];
}

/** A drag under way. It always answers from the plan it began with, so that nothing adds up on the way. */
export interface Gesture {
  /** Marks its steps in the history as one. */
  readonly mark: string;
  readonly pull: (pull: Pull) => Pulled;
}
