/** Everything on a floor plan that can be pointed at. */
export const thingKinds = [
  'outline-wall',
  'inner-wall',
  'opening',
  'furniture',
  'touch-point',
  'watch-point',
] as const;

export type ThingKind = (typeof thingKinds)[number];

/** Names one thing of a plan: by its id, outer walls by the id openings know them by (`outline:<edge>`). */
export interface PlanRef {
  readonly kind: ThingKind;
  readonly id: string;
}

export const sameRef = (one: PlanRef | null, two: PlanRef | null): boolean =>
  one?.kind === two?.kind && one?.id === two?.id;
