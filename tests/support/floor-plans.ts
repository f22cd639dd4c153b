import type { FloorPlan, InnerWall, Opening } from '@/lib/room';

/** A bare floor plan of 6 by 4 m with its walls named after where they are; `change` furnishes it. */
export const barePlan = (change: Partial<FloorPlan> = {}): FloorPlan => ({
  outline: [
    [0, 0],
    [6, 0],
    [6, 4],
    [0, 4],
  ],
  outlineWalls: ['north', 'east', 'south', 'west'].map((name) => ({ name, thickness: 0.12 })),
  innerWalls: [],
  openings: [],
  furniture: [],
  touchPoints: [],
  watchPoints: [],
  ...change,
});

/** A wall of 0.2 m across the middle of the bare plan, from north to south. */
export const middleWall: InnerWall = { id: 'mid', name: 'middle', a: [3, 0], b: [3, 4], thickness: 0.2 };

/** A doorway of 1 m in the middle wall, as high as a person. */
export const doorway = (change: Partial<Opening> = {}): Opening => ({
  id: 'door',
  wall: 'mid',
  kind: 'door',
  from: 1.5,
  to: 2.5,
  sill: 0,
  head: 2.1,
  open: true,
  transmittance: 0,
  ...change,
});
