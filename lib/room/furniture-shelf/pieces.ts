import { block, type ShelfPiece, touch } from './shelf-piece';

/**
 * The furniture shelf: what a planner drags into a room. Sizes are defaults to start from, not measurements.
 * 'usual hospital sizes': bed 2.1 × 0.95 m with its deck 0.4 to 0.8 m up, bedside cabinet 0.45 × 0.45 × 0.85 m,
 * over-bed table 0.75 × 0.40 m at 0.7 to 1.1 m, basin rim at 0.80 to 0.86 m. The rest is common practice.
 */
export const shelfPieces: readonly ShelfPiece[] = [
  {
    kind: 'bed',
    label: 'Bed',
    group: 'Ward',
    source: 'usual hospital sizes',
    parts: [
      block('mattress', [-1.05, 1.05], [-0.475, 0.475], 0.3, 0.62),
      block('headboard', [-1.1, -1.05], [-0.475, 0.475], 0.3, 1.05),
    ],
    touchPoints: [
      touch('left rail', [-0.2, -0.48], 0.8, -90),
      touch('right rail', [-0.2, 0.48], 0.8, 90),
      touch('foot board', [1.06, 0], 0.6, 0),
    ],
  },
  {
    kind: 'locker',
    label: 'Locker',
    group: 'Ward',
    source: 'usual hospital sizes',
    parts: [block('body', [-0.225, 0.225], [-0.225, 0.225], 0.08, 0.85)],
    touchPoints: [touch('handle', [0, 0.23], 0.7, 90), touch('top', [0, 0], 0.85, 90, 90)],
  },
  {
    kind: 'over-bed table',
    label: 'Over-bed table',
    group: 'Ward',
    source: 'usual hospital sizes',
    parts: [
      block('top', [-0.375, 0.375], [-0.2, 0.2], 0.87, 0.9),
      block('column', [-0.375, -0.315], [-0.05, 0.05], 0.06, 0.87),
      block('foot', [-0.375, 0.3], [-0.2, 0.2], 0, 0.06),
    ],
    touchPoints: [touch('tray top', [0, 0], 0.9, 90, 90)],
  },
  {
    kind: 'sink',
    label: 'Sink',
    group: 'Ward',
    source: 'usual hospital sizes',
    parts: [block('basin', [-0.275, 0.275], [-0.225, 0.225], 0.66, 0.84)],
    touchPoints: [touch('tap', [0, -0.15], 0.95, 90)],
  },
  {
    kind: 'chair',
    label: 'Chair',
    group: 'Furniture',
    source: 'common practice',
    parts: [
      block('seat', [-0.24, 0.24], [-0.2, 0.26], 0.4, 0.46),
      block('back', [-0.24, 0.24], [-0.26, -0.2], 0.46, 0.92),
    ],
    touchPoints: [touch('top of the back', [0, -0.2], 0.88, 90)],
  },
  {
    kind: 'desk',
    label: 'Desk',
    group: 'Furniture',
    source: 'common practice',
    parts: [
      block('top', [-0.7, 0.7], [-0.35, 0.35], 0.7, 0.73),
      block('left end', [-0.7, -0.67], [-0.33, 0.33], 0, 0.7),
      block('right end', [0.67, 0.7], [-0.33, 0.33], 0, 0.7),
    ],
    touchPoints: [touch('desk top', [0, 0.1], 0.73, 90, 90)],
  },
  {
    kind: 'cupboard',
    label: 'Cupboard',
    group: 'Furniture',
    source: 'common practice',
    parts: [block('body', [-0.5, 0.5], [-0.225, 0.225], 0, 1.9)],
    touchPoints: [touch('door handle', [0.05, 0.23], 1.05, 90)],
  },
  {
    kind: 'bench',
    label: 'Bench',
    group: 'Gym',
    source: 'common practice',
    parts: [
      block('pad', [-0.6, 0.6], [-0.15, 0.15], 0.36, 0.45),
      block('front leg', [0.4, 0.45], [-0.25, 0.25], 0, 0.36),
      block('rear leg', [-0.45, -0.4], [-0.25, 0.25], 0, 0.36),
    ],
    touchPoints: [touch('pad', [0, 0], 0.45, 90, 90)],
  },
  {
    kind: 'rack',
    label: 'Rack',
    group: 'Gym',
    source: 'common practice',
    parts: [
      block('lower tier', [-0.9, 0.9], [-0.3, 0.3], 0.15, 0.4),
      block('upper tier', [-0.9, 0.9], [-0.3, 0.05], 0.65, 0.9),
    ],
    touchPoints: [touch('upper grips', [0, 0.06], 0.8, 90), touch('lower grips', [0, 0.31], 0.3, 90)],
  },
  {
    kind: 'box',
    label: 'Box',
    group: 'Other',
    source: 'common practice',
    parts: [block('body', [-0.3, 0.3], [-0.3, 0.3], 0, 1)],
    touchPoints: [],
  },
];
