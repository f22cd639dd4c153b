/** A plan point in metres, x right, y down. */
export type Point = readonly [x: number, y: number];
