import fc from 'fast-check';
import { type BufferAttribute, BufferGeometry, ExtrudeGeometry, Ray, Shape, Vector3 as V } from 'three';
import { mergeGeometries } from 'three/examples/jsm/utils/BufferGeometryUtils.js';
import { MeshBVH } from 'three-mesh-bvh';
import { expect, test } from 'vitest';
import {
  irradianceAt,
  type Placement,
  prepareScene,
  type Scene,
  type Solid,
  type Vector3,
} from '@/lib/engine';
import { banks, placements, scenes, seed, spots, towers } from '../../support/scenes';

/**
 * Against a general-purpose ray caster (three-mesh-bvh): the same scene as triangles, the tube as many short
 * elements, one ray to each. It samples, so it agrees within what one element can carry at each shadow edge.
 */

const SAMPLES = 1200;

function solidMesh({ polygon, base, top }: Solid): BufferGeometry {
  const shape = new Shape(polygon.map(([x, y]) => ({ x, y })) as never);
  const geometry = new ExtrudeGeometry(shape, { depth: top - base, bevelEnabled: false });
  geometry.translate(0, 0, base);
  return geometry;
}

function bvhOf(scene: Scene): MeshBVH | null {
  const parts = scene.solids.map((solid) => {
    const geometry = new BufferGeometry();
    geometry.setAttribute('position', solidMesh(solid).getAttribute('position') as BufferAttribute);
    return geometry;
  });
  return parts.length === 0 ? null : new MeshBVH(mergeGeometries(parts));
}

/** Planar irradiance facing up by summing elements, and what a single element carries at most. */
function sampled(bvh: MeshBVH | null, { emitter, x, y, headingDeg }: Placement, [px, py, pz]: Vector3) {
  const angle = (headingDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const turned = (v: Vector3) => new V(v[0] * cos - v[1] * sin, v[0] * sin + v[1] * cos, v[2]);
  const p = new V(px, py, pz);
  let [sum, most] = [0, 0];
  for (const tube of emitter.tubes) {
    const a = turned(tube.a).add(new V(x, y, 0));
    const axis = turned(tube.b)
      .add(new V(x, y, 0))
      .sub(a);
    const length = axis.length();
    const u = axis.clone().divideScalar(length);
    if (tube.backed && p.clone().sub(a).dot(turned(tube.backed)) <= 1e-9) continue;
    const strength = ((tube.backed ? 2 : 1) * tube.watts) / (Math.PI ** 2 * length);
    for (let i = 0; i < SAMPLES; i++) {
      const q = a.clone().addScaledVector(u, ((i + 0.5) / SAMPLES) * length);
      const d = q.sub(p);
      const r = d.length();
      d.divideScalar(r);
      if (d.z <= 0) continue;
      const element =
        (strength * Math.sqrt(Math.max(0, 1 - d.dot(u) ** 2)) * d.z * length) / SAMPLES / r ** 2;
      most = Math.max(most, element);
      const hit = bvh?.raycastFirst(new Ray(p, d), 2, 1e-7, r - 1e-7);
      if (!hit) sum += element;
    }
  }
  return { sum, most };
}

const inside = (solid: Solid, [x, y, z]: Vector3) => {
  if (z < solid.base - 0.01 || z > solid.top + 0.01) return false;
  let within = false;
  solid.polygon.forEach(([ax, ay], i) => {
    const [bx, by] = solid.polygon[(i + 1) % solid.polygon.length];
    if (ay > y !== by > y && x < ((bx - ax) * (y - ay)) / (by - ay) + ax) within = !within;
  });
  return within;
};

test(`agrees with a triangle ray caster wherever that one can tell (seed ${seed})`, () => {
  let compared = 0;
  fc.assert(
    fc.property(
      scenes,
      placements([...towers, ...banks]),
      fc.array(spots, { minLength: 3, maxLength: 3 }),
      (scene, placement, points) => {
        const furniture = { solids: scene.solids, walls: [] };
        const bvh = bvhOf(furniture);
        const prepared = prepareScene(furniture);
        for (const p of points) {
          // Inside a solid, and on a tube, the two mean different things.
          if (furniture.solids.some((solid) => inside(solid, p))) continue;
          if (Math.hypot(p[0] - placement.x, p[1] - placement.y) < 0.8) continue;
          const exact = irradianceAt(prepared, placement, { p, mode: 'normal', n: [0, 0, 1] });
          const { sum, most } = sampled(bvh, placement, p);
          // Each tube can be cut at two edges a solid; each edge is worth one element.
          const slack = most * 2 * (1 + furniture.solids.length) + 2e-4 * sum;
          expect(Math.abs(exact - sum)).toBeLessThanOrEqual(slack);
          compared++;
        }
      },
    ),
    { seed, numRuns: 60 },
  );
  expect(compared).toBeGreaterThan(100);
});
