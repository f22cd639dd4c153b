import type { GapCause, GridSurface, Placement, Point, Scene } from '@/lib/engine/types';

/** What a dose map is asked for on: a plane at a height, or the top of whatever stands there. */
export type SurfaceChoice = { readonly kind: 'plane'; readonly z: number } | { readonly kind: 'tops' };

/** A room as a worker needs it. `key` names this geometry and surface; jobs refer to it. */
export interface RoomJob {
  readonly key: string;
  readonly scene: Scene;
  readonly outline: readonly Point[];
  readonly voids: readonly (readonly Point[])[];
  readonly surface: SurfaceChoice;
  /** Grid step in metres. */
  readonly step: number;
}

export interface TimedPlacement {
  readonly placement: Placement;
  /** Seconds. */
  readonly dwell: number;
}

export interface GapReport {
  readonly number: number;
  /** m² */
  readonly area: number;
  readonly lowestRatio: number;
  readonly cause: GapCause;
  /** Plan metres, well inside the gap: where its number is drawn. */
  readonly at: Point;
}

export interface GapsReport {
  readonly gaps: readonly GapReport[];
  /** m² of under-dosed spots too small to be gaps. */
  readonly specksArea: number;
  /** columns·rows; the gap's number in each cell, 0 for none. */
  readonly labels: Int32Array;
}

/** The functions a dose worker answers to, through Comlink. */
export interface DoseWorker {
  /** Prepares a room and answers its grid. */
  load(room: RoomJob): GridSurface;
  /** W/m² a cell, from one stop. */
  irradiance(roomKey: string, placement: Placement): Float32Array;
  /** Gaps with their causes. `dose` is J/m² a cell, `target` J/m². */
  gaps(roomKey: string, stops: readonly TimedPlacement[], dose: Float32Array, target: number): GapsReport;
}
