import type { Ring } from '@/lib/geometry/polygon';
import { boundingBox } from '@/lib/geometry/polygon';
import { forEachRun, type Lattice } from '@/lib/geometry/raster';
import type { GridSurface, Solid } from './types';

export interface PlanArea {
  /** The room-side face of the outer wall, either orientation, convex or not. */
  readonly outline: Ring;
  /** Slabs of inner walls and the like: no surface where they stand. */
  readonly voids?: readonly Ring[];
  readonly solids: readonly Solid[];
  /** Cell size in metres. */
  readonly step: number;
}

/** Cells at height z facing up, without those inside a part: base ≤ z < top. */
export function planeSurface(area: PlanArea & { readonly z: number }): GridSurface {
  const lattice = latticeOver(area);
  const mask = floorMask(area, lattice);
  for (const solid of area.solids) {
    if (solid.base <= area.z && area.z < solid.top) fill(mask, solid.polygon, lattice, 0);
  }
  return { ...lattice, mask, z: area.z };
}

/** For each cell the top of the tallest part over it, or the floor at 0. */
export function topsSurface(area: PlanArea): GridSurface {
  const lattice = latticeOver(area);
  const mask = floorMask(area, lattice);
  const z = new Float32Array(mask.length);
  for (const solid of area.solids) {
    forEachRun(solid.polygon, lattice, 'closed', (from, to, row) => {
      for (let cell = row * lattice.columns + from; from < to; from++, cell++) {
        if (solid.top > z[cell]) z[cell] = solid.top;
      }
    });
  }
  return { ...lattice, mask, z };
}

function latticeOver({ outline, step }: PlanArea): Lattice {
  if (!(step > 0)) throw new Error(`Cell size ${step} m must be more than 0.`);
  const box = boundingBox(outline);
  // A room a rounding error longer than a whole number of cells does not get one more.
  const cells = (metres: number) => Math.max(1, Math.ceil(metres / step - 1e-6));
  return {
    originX: box.minX,
    originY: box.minY,
    step,
    columns: cells(box.maxX - box.minX),
    rows: cells(box.maxY - box.minY),
  };
}

/** Cell centres strictly inside the outline and not in a void. */
function floorMask({ outline, voids = [] }: PlanArea, lattice: Lattice): Uint8Array {
  const mask = new Uint8Array(lattice.columns * lattice.rows);
  forEachRun(outline, lattice, 'strict', (from, to, row) => {
    mask.fill(1, row * lattice.columns + from, row * lattice.columns + to);
  });
  for (const ring of voids) fill(mask, ring, lattice, 0);
  return mask;
}

function fill(mask: Uint8Array, ring: Ring, lattice: Lattice, value: number): void {
  forEachRun(ring, lattice, 'closed', (from, to, row) => {
    mask.fill(value, row * lattice.columns + from, row * lattice.columns + to);
  });
}
