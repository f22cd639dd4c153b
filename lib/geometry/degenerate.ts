/**
 * The degenerate-case table: every tie that exact geometry leaves open is decided here, once, and
 * tested row by row in tests/unit/engine/degenerate.test.ts.
 *
 * | case | decision | how |
 * | --- | --- | --- |
 * | receiver on a face of a solid | looks outward, that face does not hide | solids shrink by `SKIN` |
 * | ray sliding along a face, touching an edge or a corner | free | the same shrinking |
 * | seam between two pieces of one split footprint | opaque | seam sides grow by `SKIN` instead |
 * | parts stacked or set side by side, seen across the joint | opaque | hidden intervals merge within `MERGE` |
 * | ray crossing a wall at its very end or at a corner of two walls | blocked | walls grow by `SKIN` at both ends |
 * | ray touching the jamb of an opening | blocked | openings shrink by `SKIN` along the wall |
 * | ray lying in a wall's own plane | free | a line has no thickness to hide behind |
 * | receiver or tube on a wall's line | that wall does not hide | both ends must be more than `SKIN` off it |
 * | footprint corner repeated, or on a straight line | dropped | `tidyRing` |
 * | footprint of no area, crossing itself, under three corners | refused, with words | `prepareScene` |
 * | opening of no width or height | no opening | never wider than zero |
 * | receiver beyond a tube's end on its axis line | exactly 0 | sin of the angle is 0 |
 * | receiver on the tube | refused | `UndefinedReadingError` |
 * | receiver in the plane a backed tube turns away from | exactly 0 | front means more than `SKIN` ahead |
 * | facing reading straight under or over a stop | refused | `UndefinedReadingError` |
 * | cell centre on the outline or on the edge of a part or slab | left out | closed polygons, within `EDGE` |
 */

/** Metres. A hundred times the rounding of plan coordinates, a hundredth of any dust grain. */
export const SKIN = 1e-11;

/** Hidden stretches closer than this fraction of the tube are one stretch. */
export const MERGE = 1e-8;

/** Metres. A point this close to a line lies on it. */
export const EDGE = 1e-9;
