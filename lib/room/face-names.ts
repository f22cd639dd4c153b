import type { Vector3 } from '@/lib/engine/types';
import type { FloorPlan } from './schema/floor-plan';
import { slabOf, toScene } from './to-scene';

/** Names of the scene's walls, in the order `toScene` puts them: the outline, then four faces of each inner wall. */
const sceneWallNames = (plan: FloorPlan): string[] => [
  ...plan.outline.map((_, edge) => plan.outlineWalls[edge]?.name ?? `wall ${edge + 1}`),
  ...plan.innerWalls.flatMap((wall) => (slabOf(wall) ? Array<string>(4).fill(wall.name) : [])),
];

const sides = ['right', 'lower', 'left', 'upper'] as const;

/** Which way a face looks on the sheet. */
const sideOf = ([x, y]: Vector3): string => sides[(Math.round(Math.atan2(y, x) / (Math.PI / 2)) + 4) % 4];

/** Names upright faces as a person would point at them: `corridor wall`, `Bed A: mattress, left side`. */
export function faceNames(
  plan: FloorPlan,
  faces: readonly { readonly kind: 'wall' | 'solid'; readonly index: number; readonly normal: Vector3 }[],
): string[] {
  const walls = sceneWallNames(plan);
  const { origins } = toScene(plan);
  return faces.map(({ kind, index, normal }) => {
    if (kind === 'wall') return walls[index] ?? 'wall';
    const origin = origins[index];
    return origin
      ? `${origin.furnitureName}: ${origin.partName}, ${sideOf(normal)} side`
      : `${sideOf(normal)} side`;
  });
}
