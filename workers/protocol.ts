import type {
  GapCause,
  GridSurface,
  Pass,
  Placement,
  Point,
  Scene,
  SideStrip,
  Spot,
  TimedStop,
} from '@/lib/engine';

/** What a dose map is asked for on: a plane at a height, the top of whatever stands there, or every upright face. */
export type SurfaceChoice =
  | { readonly kind: 'plane'; readonly z: number }
  | { readonly kind: 'tops' }
  | { readonly kind: 'sides' };

/** A room as a worker needs it. `key` names this geometry and surface; jobs refer to it. */
export interface RoomJob {
  readonly key: string;
  readonly scene: Scene;
  readonly outline: readonly Point[];
  readonly voids: readonly (readonly Point[])[];
  /** Metres: upright faces of walls end there. */
  readonly ceiling: number;
  /** Touch points: read whatever the surface is. */
  readonly spots: readonly Spot[];
  readonly surface: SurfaceChoice;
  /** Grid step in metres. */
  readonly step: number;
}

/** The cells a map has a value for: a grid in plan, or upright strips one after the other. */
export type MapSurface =
  | { readonly kind: 'grid'; readonly grid: GridSurface; readonly mask: Uint8Array }
  | { readonly kind: 'sides'; readonly strips: readonly SideStrip[]; readonly mask: Uint8Array };

/** One lit thing: a stop, read per second of dwell, or a pass at 1 m/s, read per second a metre takes. */
export type LampJob =
  | { readonly kind: 'stop'; readonly placement: Placement }
  | { readonly kind: 'pass'; readonly pass: Pass };

/** What one lit thing gives: multiplied by its dwell (s), or divided by its speed (m/s), it is a dose in J/m². */
export interface LampField {
  readonly map: Float32Array;
  /** One for each touch point. */
  readonly spots: Float64Array;
}

export interface GapReport {
  readonly number: number;
  /** m² */
  readonly area: number;
  readonly lowestRatio: number;
  readonly cause: GapCause;
  /** Plan metres, well inside the gap: where its number is drawn. */
  readonly at: Point;
  /** Which strip it lies on, for upright faces. */
  readonly strip: number | null;
}

export interface GapsReport {
  readonly gaps: readonly GapReport[];
  /** m² of under-dosed spots too small to be gaps. */
  readonly specksArea: number;
  /** The gap's number in each cell, 0 for none. */
  readonly labels: Int32Array;
}

/** What is lit and for how long, passes at their real speed. */
export interface LitPlan {
  readonly stops: readonly TimedStop[];
  readonly passes: readonly Pass[];
}

/** The functions a dose worker answers to, through Comlink. */
export interface DoseWorker {
  /** Prepares a room and answers its cells. */
  load(room: RoomJob): MapSurface;
  light(roomKey: string, lamp: LampJob): LampField;
  /** Gaps with their causes. `dose` is J/m² a cell, `target` J/m². */
  gaps(roomKey: string, lit: LitPlan, dose: Float32Array, target: number): GapsReport;
}
