/**
 * The shapes the engine works on. SI units; plan axes x right, y down; z up from finished floor
 * (a left-handed frame: mind cross products). Headings in degrees clockwise from +x on screen.
 */

export type Point = readonly [x: number, y: number];
export type Vector3 = readonly [x: number, y: number, z: number];

/** A thin straight tube from `a` to `b` in its emitter's own axes (x ahead, y to its right, z up), metres. */
export interface Tube {
  readonly a: Vector3;
  readonly b: Vector3;
  /** UV-C output at 254 nm in watts, maintenance factor already applied. */
  readonly watts: number;
  /** Unit vector perpendicular to the tube: it radiates only to that side, doubled. `null`: all round. */
  readonly backed: Vector3 | null;
}

export interface Emitter {
  readonly tubes: readonly Tube[];
}

/** An emitter set down at a plan position. */
export interface Placement {
  readonly emitter: Emitter;
  readonly x: number;
  readonly y: number;
  readonly headingDeg: number;
}

/** An emitter pushed, lit, along a path. `headingDeg` null: along each leg; turning at a corner takes no time. */
export interface Pass {
  readonly emitter: Emitter;
  readonly path: readonly Point[];
  /** m/s */
  readonly speed: number;
  readonly headingDeg: number | null;
}

/** Opaque upright prism; the footprint is simple, either orientation, convex or not, and not closed. */
export interface Solid {
  readonly polygon: readonly Point[];
  readonly base: number;
  readonly top: number;
}

/** A hole in a wall, from..to metres along it from `a`, sill..head in z. */
export interface WallOpening {
  readonly from: number;
  readonly to: number;
  readonly sill: number;
  readonly head: number;
  /** 254 nm transmittance of what fills it: 1 free air, 0 as solid as the wall, between for glazing. */
  readonly transmittance: number;
}

/** Zero thickness, opaque at every height, end points included. */
export interface Wall {
  readonly a: Point;
  readonly b: Point;
  readonly openings: readonly WallOpening[];
}

export interface Scene {
  readonly solids: readonly Solid[];
  readonly walls: readonly Wall[];
}

/** What a reading means: `normal` planar with a direction, `spherical` fluence rate, `facing` aimed level at the lamp. */
export type ReadingMode = 'normal' | 'spherical' | 'facing';

/**
 * A rectangular lattice of receivers facing up, row by row.
 * Cell (column i, row j) has its centre at (originX + (i+½)·step, originY + (j+½)·step).
 */
export interface GridSurface {
  readonly originX: number;
  readonly originY: number;
  readonly step: number;
  readonly columns: number;
  readonly rows: number;
  /** columns·rows; 1 where the cell counts, 0 where it is outside the room or inside something. */
  readonly mask: Uint8Array;
  /** Height of every cell (plane), or one height per cell (tops). */
  readonly z: number | Float32Array;
}

export type GapCause = 'facing away' | 'walled off' | 'hidden' | 'partly hidden' | 'short';
