import type { FloorPlanDocument, PlanPoint } from '@/lib/room';

/** An edit that cannot be done, and why: the plan stays as it was. */
export interface Refused {
  readonly refused: string;
}

/** What a named action on a floor plan answers: the next plan, or why there is none. */
export type Outcome = FloorPlanDocument | Refused;

export type PlanAction = (document: FloorPlanDocument) => Outcome;

export const isRefused = (outcome: Outcome): outcome is Refused => 'refused' in outcome;

/** Plans are kept to a tenth of a millimetre: what rounding leaves behind is no measure. */
export const tidy = (metres: number): number => Math.round(metres * 1e4) / 1e4 + 0;

export const tidyPoint = ([x, y]: PlanPoint): PlanPoint => [tidy(x), tidy(y)];
