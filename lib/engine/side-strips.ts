import { sideOf } from '@/lib/geometry/polygon';
import { placeTubes } from './placed-tube';
import type { PreparedScene } from './prepare-scene';
import type { PlanArea } from './surfaces';
import { createTracer, ON_TUBE, traceTube } from './tracer';
import type { Placement, Point, Vector3, Wall } from './types';

/**
 * An upright face as a lattice: columns along it from `a` to `b`, rows from `base` up. Cell (i, j), at index
 * j·columns + i, has its centre at a + (i+½)·cellWidth along and base + (j+½)·cellHeight up.
 */
export interface SideStrip {
  readonly kind: 'wall' | 'solid';
  /** Which wall or solid of the input. */
  readonly index: number;
  /** Which side of the footprint (from that corner), or for walls 0: right of a→b on screen, 1: left. */
  readonly side: number;
  readonly a: Point;
  readonly b: Point;
  /** Unit, level, pointing out of the wall or solid into the room. */
  readonly normal: Vector3;
  readonly base: number;
  readonly top: number;
  readonly columns: number;
  readonly rows: number;
  /** Metres; whole cells fill the face exactly, so they are at most the step asked for. */
  readonly cellWidth: number;
  readonly cellHeight: number;
  /** 1 where there is a surface open to the room; 0 at openings, outside, and where something stands against it. */
  readonly mask: Uint8Array;
}

export interface SidesInput extends PlanArea {
  readonly walls: readonly Wall[];
  readonly ceiling: number;
}

/** Far enough off a face to tell which side a point is on, near enough that nothing fits between. */
const OFF = 1e-6;

/** Every upright face of walls and furniture that some of the room can see. */
export function sideStrips(input: SidesInput): SideStrip[] {
  const walls = input.walls.flatMap(({ a, b }, index) => [
    strip(input, 'wall', index, 0, a, b, 0, input.ceiling),
    strip(input, 'wall', index, 1, b, a, 0, input.ceiling),
  ]);
  const solids = input.solids.flatMap(({ polygon, base, top }, index) => {
    const outward = turnsRight(polygon);
    return polygon.map((p, side) => {
      const q = polygon[(side + 1) % polygon.length];
      return outward
        ? strip(input, 'solid', index, side, q, p, base, Math.min(top, input.ceiling))
        : strip(input, 'solid', index, side, p, q, base, Math.min(top, input.ceiling));
    });
  });
  return [...walls, ...solids].filter((face): face is SideStrip => face?.mask.includes(1) ?? false);
}

function turnsRight(polygon: readonly Point[]): boolean {
  let twice = 0;
  polygon.forEach(([x, y], i) => {
    const [x2, y2] = polygon[(i + 1) % polygon.length];
    twice += x * y2 - x2 * y;
  });
  return twice > 0;
}

/** The face that lies to the right of a→b on screen (y down): its normal is (−dy, dx). */
function strip(
  input: SidesInput,
  kind: SideStrip['kind'],
  index: number,
  side: number,
  a: Point,
  b: Point,
  base: number,
  top: number,
): SideStrip | null {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (!(length > 0) || !(top > base)) return null;
  const columns = Math.max(1, Math.ceil(length / input.step - 1e-6));
  const rows = Math.max(1, Math.ceil((top - base) / input.step - 1e-6));
  const face = {
    kind,
    index,
    side,
    a,
    b,
    normal: [-(b[1] - a[1]) / length, (b[0] - a[0]) / length, 0] as const,
    base,
    top,
    columns,
    rows,
    cellWidth: length / columns,
    cellHeight: (top - base) / rows,
    mask: new Uint8Array(columns * rows),
  };
  maskOpenToRoom(input, face);
  return face;
}

function maskOpenToRoom(input: SidesInput, face: SideStrip): void {
  const { outline, voids = [], solids, walls } = input;
  const openings = face.kind === 'wall' ? walls[face.index].openings : [];
  const length = face.columns * face.cellWidth;
  for (let i = 0; i < face.columns; i++) {
    const [x, y] = stripPoint(face, i, 0);
    const fx = x + OFF * face.normal[0];
    const fy = y + OFF * face.normal[1];
    if (sideOf(fx, fy, outline) !== 'inside') continue;
    if (voids.some((ring) => sideOf(fx, fy, ring) === 'inside')) continue;
    const against = solids.filter(({ polygon }) => sideOf(fx, fy, polygon) !== 'outside');
    // Openings are measured from the wall's own start, which is the end of its second face.
    const along = (i + 0.5) * face.cellWidth;
    const fromStart = face.side === 0 ? along : length - along;
    const gaps = openings.filter((o) => o.transmittance > 0 && o.from < fromStart && fromStart < o.to);
    for (let j = 0; j < face.rows; j++) {
      const z = face.base + (j + 0.5) * face.cellHeight;
      if (against.some((solid) => solid.base < z && z < solid.top)) continue;
      if (gaps.some((o) => o.transmittance === 1 && o.sill < z && z < o.head)) continue;
      face.mask[j * face.columns + i] = 1;
    }
  }
}

/** Centre of cell (i, j) in room axes. */
export function stripPoint(face: SideStrip, i: number, j: number): Vector3 {
  const f = (i + 0.5) / face.columns;
  return [
    face.a[0] + f * (face.b[0] - face.a[0]),
    face.a[1] + f * (face.b[1] - face.a[1]),
    face.base + (j + 0.5) * face.cellHeight,
  ];
}

/** Irradiance (W/m²) of every cell of a strip, on its outward normal; 0 where the mask is 0. */
export function irradianceStrip(
  prepared: PreparedScene,
  placement: Placement,
  face: SideStrip,
  out: Float32Array = new Float32Array(face.columns * face.rows),
): Float32Array {
  const tracer = createTracer(prepared);
  const tubes = placeTubes(placement);
  const [nx, ny, nz] = face.normal;
  out.fill(0);
  for (let j = 0; j < face.rows; j++) {
    for (let i = 0; i < face.columns; i++) {
      const cell = j * face.columns + i;
      if (face.mask[cell] === 0) continue;
      const [x, y, z] = stripPoint(face, i, j);
      for (const tube of tubes) {
        const value = traceTube(tracer, tube, x, y, z, false, nx, ny, nz);
        if (value !== ON_TUBE) out[cell] += value;
      }
    }
  }
  return out;
}
