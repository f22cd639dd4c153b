import { BoxGeometry, BufferGeometry, ExtrudeGeometry, Ray, Shape, Vector2, Vector3 } from 'three';
import { mergeGeometries } from 'three/examples/jsm/utils/BufferGeometryUtils.js';
import { MeshBVH } from 'three-mesh-bvh';
import type { GridSurface, Placement, Scene } from '@/lib/engine';

/** Points a tube is sampled at. */
const SAMPLES = 16;

/** A scene as triangles in a bounding volume hierarchy: the general-purpose way to do what the engine does exactly. */
export function bvhOf({ solids }: Scene): MeshBVH {
  const parts = solids.map(({ polygon, base, top }) => {
    const shape = new Shape(polygon.map(([x, y]) => new Vector2(x, y)));
    const solid = new ExtrudeGeometry(shape, { depth: top - base, bevelEnabled: false }).translate(
      0,
      0,
      base,
    );
    return new BufferGeometry().setAttribute('position', solid.getAttribute('position'));
  });
  // A hierarchy of nothing cannot be built: a grain under the floor hides nothing.
  const grain = new BoxGeometry(1e-3, 1e-3, 1e-3).toNonIndexed().translate(0, 0, -10);
  parts.push(new BufferGeometry().setAttribute('position', grain.getAttribute('position')));
  return new MeshBVH(mergeGeometries(parts));
}

/** Irradiance (W/m²) facing up at the given cells, by sampling; W/m² each, in their order. */
export function sampledMap(
  bvh: MeshBVH,
  { emitter, x, y, headingDeg }: Placement,
  surface: GridSurface,
  cells: readonly number[],
): Float32Array {
  const angle = (headingDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const turned = ([vx, vy, vz]: readonly number[]) =>
    new Vector3(vx * cos - vy * sin, vx * sin + vy * cos, vz);
  const tubes = emitter.tubes.map((tube) => {
    const a = turned(tube.a).add(new Vector3(x, y, 0));
    const axis = turned(tube.b)
      .add(new Vector3(x, y, 0))
      .sub(a);
    const length = axis.length();
    const strength = ((tube.backed ? 2 : 1) * tube.watts) / (Math.PI ** 2 * length);
    const points = Array.from({ length: SAMPLES }, (_, i) =>
      a.clone().addScaledVector(axis, (i + 0.5) / SAMPLES),
    );
    return {
      a,
      u: axis.divideScalar(length),
      m: tube.backed && turned(tube.backed),
      points,
      each: (strength * length) / SAMPLES,
    };
  });
  const out = new Float32Array(cells.length);
  const ray = new Ray();
  cells.forEach((cell, k) => {
    const z = typeof surface.z === 'number' ? surface.z : surface.z[cell];
    ray.origin.set(
      surface.originX + ((cell % surface.columns) + 0.5) * surface.step,
      surface.originY + (Math.floor(cell / surface.columns) + 0.5) * surface.step,
      z,
    );
    for (const { a, u, m, points, each } of tubes) {
      if (m && (ray.origin.x - a.x) * m.x + (ray.origin.y - a.y) * m.y + (z - a.z) * m.z <= 0) continue;
      for (const point of points) {
        const d = ray.direction.copy(point).sub(ray.origin);
        const r = d.length();
        d.divideScalar(r);
        if (d.z <= 0 || bvh.raycastFirst(ray, 2, 1e-7, r - 1e-7)) continue;
        out[k] += (each * Math.sqrt(Math.max(0, 1 - d.dot(u) ** 2)) * d.z) / (r * r);
      }
    }
  });
  return out;
}
