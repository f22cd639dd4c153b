import type { Placement, Tube, Vector3 } from './types';

/** A tube in room axes, ready for the closed forms. Lengths in metres. */
export interface PlacedTube {
  /** Lower end for an upright tube, else the end `a`. */
  readonly ax: number;
  readonly ay: number;
  readonly az: number;
  /** Unit vector along the tube. */
  readonly ux: number;
  readonly uy: number;
  readonly uz: number;
  readonly length: number;
  /** Φ/(π² L) in W/m, doubled for a backed tube: peak intensity per unit length towards the side it serves. */
  readonly strength: number;
  /** Direction a backed tube radiates to; all zero together with `backed` false. */
  readonly mx: number;
  readonly my: number;
  readonly mz: number;
  readonly backed: boolean;
  readonly upright: boolean;
}

/** Tubes leaning less than this (as a fraction of their length) are upright; it moves no shadow by a micrometre. */
const UPRIGHT = 1e-9;

/** Sets an emitter down: turned clockwise (x towards y) by its heading, then shifted to its mark. */
export function placeTubes({ emitter, x, y, headingDeg }: Placement): PlacedTube[] {
  const [cos, sin] = turnOf(headingDeg);
  const turned = (v: Vector3): Vector3 => [v[0] * cos - v[1] * sin, v[0] * sin + v[1] * cos, v[2]];
  const moved = (v: Vector3): Vector3 => {
    const t = turned(v);
    return [t[0] + x, t[1] + y, t[2]];
  };
  return emitter.tubes.map((tube) => placeTube(moved, turned, tube));
}

/** Quarter turns come out exact, so that a turned room gives a turned map. */
function turnOf(headingDeg: number): readonly [number, number] {
  const heading = ((headingDeg % 360) + 360) % 360;
  const quarter = ([1, 0, -1, 0] as const)[heading / 90];
  if (quarter !== undefined) return [quarter, ([0, 1, 0, -1] as const)[heading / 90]];
  const radians = (heading * Math.PI) / 180;
  return [Math.cos(radians), Math.sin(radians)];
}

function placeTube(moved: (v: Vector3) => Vector3, turned: (v: Vector3) => Vector3, tube: Tube): PlacedTube {
  const ends = [moved(tube.a), moved(tube.b)];
  const [a, b] = ends[0][2] <= ends[1][2] ? ends : [ends[1], ends[0]];
  const length = Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
  if (!(length > 0) || !Number.isFinite(tube.watts)) {
    throw new Error(
      `A tube needs a length above 0 and a known output (length ${length} m, ${tube.watts} W).`,
    );
  }
  const upright = Math.hypot(b[0] - a[0], b[1] - a[1]) <= UPRIGHT * length;
  const m = tube.backed ? turned(tube.backed) : ([0, 0, 0] as const);
  return {
    ax: a[0],
    ay: a[1],
    az: a[2],
    ux: upright ? 0 : (b[0] - a[0]) / length,
    uy: upright ? 0 : (b[1] - a[1]) / length,
    uz: upright ? 1 : (b[2] - a[2]) / length,
    length,
    strength: ((tube.backed ? 2 : 1) * tube.watts) / (Math.PI ** 2 * length),
    mx: m[0],
    my: m[1],
    mz: m[2],
    backed: tube.backed !== null,
    upright,
  };
}
