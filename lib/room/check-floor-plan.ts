import { selfCrossing, sideOf, signedArea } from '@/lib/geometry/polygon';
import { outlineFault } from './check-outline';
import type { PlanRef } from './plan-ref';
import { distanceToRing, reachOutside } from './reach-outside';
import type { FloorPlan, FloorPlanDocument, Furniture } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';
import { footprintInPlan, slabOf } from './to-scene';
import { onWall, outlineWallId, type WallRun, wallRuns } from './wall-geometry';

/** Something on the plan that cannot be as drawn (`wrong`) or is worth a second look (`odd`), and where. */
export interface PlanProblem {
  readonly severity: 'wrong' | 'odd';
  readonly message: string;
  readonly at: PlanPoint;
  readonly thing: PlanRef | null;
}

/** Less than this over a line is what a tape cannot tell, metres. */
const SLACK = 0.001;

const metres = (value: number): string => `${value.toFixed(2)} m`;

function outlineProblems(plan: FloorPlan): PlanProblem[] {
  const fault = outlineFault(plan.outline, (edge) => plan.outlineWalls[edge]?.name ?? `wall ${edge + 1}`);
  return fault
    ? [
        {
          severity: 'wrong',
          message: fault.message,
          at: fault.at,
          thing: fault.edge === null ? null : { kind: 'outline-wall', id: outlineWallId(fault.edge) },
        },
      ]
    : [];
}

function innerWallProblems(plan: FloorPlan): PlanProblem[] {
  return plan.innerWalls.flatMap(({ id, name, a, b }): PlanProblem[] => {
    const thing: PlanRef = { kind: 'inner-wall', id };
    if (Math.hypot(b[0] - a[0], b[1] - a[1]) < SLACK)
      return [{ severity: 'wrong', message: `The ${name} has no length.`, at: a, thing }];
    const reach = reachOutside([a, b], plan.outline);
    return reach.metres > SLACK
      ? [{ severity: 'wrong', message: `The ${name} runs out of the room.`, at: reach.at, thing }]
      : [];
  });
}

function openingProblems(plan: FloorPlan, ceiling: number, runs: readonly WallRun[]): PlanProblem[] {
  return plan.openings.flatMap((opening, i): PlanProblem[] => {
    const thing: PlanRef = { kind: 'opening', id: opening.id };
    const run = runs.find((wall) => wall.id === opening.wall);
    const wrong = (message: string, at: PlanPoint): PlanProblem => ({
      severity: 'wrong',
      message,
      at,
      thing,
    });
    if (!run) return [wrong(`A ${opening.kind} belongs to a wall that is not there.`, plan.outline[0])];
    const at = onWall(run, (opening.from + opening.to) / 2, 0);
    const found: PlanProblem[] = [];
    if (opening.to > run.length + SLACK)
      found.push(
        wrong(
          `The ${opening.kind} in the ${run.name} reaches ${metres(opening.to - run.length)} past its end.`,
          at,
        ),
      );
    const other = plan.openings
      .slice(0, i)
      .find(
        ({ wall, from, to }) =>
          wall === opening.wall && Math.min(to, opening.to) - Math.max(from, opening.from) > SLACK,
      );
    if (other) found.push(wrong(`A ${opening.kind} and a ${other.kind} in the ${run.name} overlap.`, at));
    if (opening.head > ceiling + SLACK)
      found.push(wrong(`The ${opening.kind} in the ${run.name} is higher than the ceiling.`, at));
    return found;
  });
}

function pieceProblems(piece: Furniture, { outline, innerWalls }: FloorPlan, ceiling: number): PlanProblem[] {
  const thing: PlanRef = { kind: 'furniture', id: piece.id };
  const say = (severity: PlanProblem['severity'], message: string, at: PlanPoint = piece.at) => [
    { severity, message, at, thing },
  ];
  const footprints = piece.parts.map((part) => footprintInPlan(piece, part));
  const broken = footprints.findIndex(
    (footprint) => Math.abs(signedArea(footprint)) < 1e-6 || selfCrossing(footprint),
  );
  if (broken >= 0)
    return say('wrong', `The ${piece.parts[broken].name} of ${piece.name} has no area or crosses itself.`);
  const reaches = footprints.map((footprint) => reachOutside(footprint, outline));
  const worst = reaches.reduce((most, reach) => (reach.metres > most.metres ? reach : most));
  if (worst.metres > SLACK) {
    const allOut = footprints.flat().every(([x, y]) => sideOf(x, y, outline) === 'outside');
    return say(
      'wrong',
      allOut
        ? `${piece.name} stands outside the room.`
        : `${piece.name} reaches ${metres(worst.metres)} out of the room.`,
      worst.at,
    );
  }
  if (piece.parts.some((part) => part.top > ceiling + SLACK))
    return say('wrong', `${piece.name} is higher than the ceiling.`);
  const wall = innerWalls.find((candidate) => {
    const slab = slabOf(candidate);
    return slab !== null && footprints.some((footprint) => ringsOverlap(footprint, slab));
  });
  return wall ? say('odd', `${piece.name} stands in the ${wall.name}.`) : [];
}

/** Do two footprints share more than an edge? By corners and middles: enough for upright furniture and slabs. */
function ringsOverlap(one: readonly PlanPoint[], two: readonly PlanPoint[]): boolean {
  const deep = ([x, y]: PlanPoint, ring: readonly PlanPoint[]) =>
    sideOf(x, y, ring) === 'inside' && distanceToRing(x, y, ring) > SLACK;
  const middle = (ring: readonly PlanPoint[]): PlanPoint => [
    ring.reduce((sum, [x]) => sum + x, 0) / ring.length,
    ring.reduce((sum, [, y]) => sum + y, 0) / ring.length,
  ];
  const along = (ring: readonly PlanPoint[]): PlanPoint[] =>
    ring.flatMap(([x, y], i): PlanPoint[] => {
      const [nx, ny] = ring[(i + 1) % ring.length];
      return [
        [x, y],
        [(x + nx) / 2, (y + ny) / 2],
      ];
    });
  return (
    [...along(one), middle(one)].some((at) => deep(at, two)) ||
    [...along(two), middle(two)].some((at) => deep(at, one))
  );
}

function spotProblems(plan: FloorPlan, ceiling: number): PlanProblem[] {
  return plan.touchPoints.flatMap(({ id, name, at, height }): PlanProblem[] => {
    const thing: PlanRef = { kind: 'touch-point', id };
    const outside =
      sideOf(at[0], at[1], plan.outline) === 'outside' && distanceToRing(at[0], at[1], plan.outline) > SLACK;
    if (outside)
      return [{ severity: 'odd', message: `The touch point “${name}” is outside the room.`, at, thing }];
    return height > ceiling
      ? [{ severity: 'odd', message: `The touch point “${name}” is above the ceiling.`, at, thing }]
      : [];
  });
}

/** Everything about a floor plan that cannot be, or is worth a second look, in the order it is listed. */
export function planProblems({ floorPlan: plan, ceiling }: FloorPlanDocument): PlanProblem[] {
  const outline = outlineProblems(plan);
  const runs = wallRuns(plan);
  // Inside and outside mean nothing until the outline is one.
  if (outline.length > 0) return [...outline, ...openingProblems(plan, ceiling, runs)];
  return [
    ...innerWallProblems(plan),
    ...openingProblems(plan, ceiling, runs),
    ...plan.furniture.flatMap((piece) => pieceProblems(piece, plan, ceiling)),
    ...spotProblems(plan, ceiling),
  ];
}
