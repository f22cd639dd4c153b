import { floorPlanDocumentSchema } from '@/lib/room';
import { barePlan, doorway, middleWall } from '../../support/floor-plans';
import { box } from '../../support/plans';
import { noNumbers, refusesWhatIsSpoilt } from '../../support/spoilt';

const good = {
  ceiling: 2.6,
  floorPlan: barePlan({
    innerWalls: [middleWall],
    openings: [doorway()],
    furniture: [box('b', [1, 1])],
    touchPoints: [{ id: 't', name: 'switch', at: [1, 0.01], height: 1.1, facing: -90, tilt: 0 }],
    watchPoints: [{ id: 'w', name: 'corridor', at: [3, 5], height: 1.7 }],
  }),
};

const part = 'floorPlan.furniture[0].parts[0]';
const opening = 'floorPlan.openings[0]';
const watch = 'floorPlan.watchPoints[0]';

refusesWhatIsSpoilt(floorPlanDocumentSchema, good, [
  ['an unknown key', 'floorPlan.roof', true, /^Unknown key: roof$/, 'floorPlan'],
  ['an unknown key deep inside', `${part}.colour`, 'red', /^Unknown key: colour$/, part],
  ['a missing list', 'floorPlan.openings', undefined, /Is missing/],
  ['a thing for a list', 'floorPlan.innerWalls', {}, /Must be a list, not an object/],
  [
    'a room of two corners',
    'floorPlan.outline',
    [
      [0, 0],
      [1, 1],
    ],
    /at least 3 corners/,
  ],
  ['a wall too few', 'floorPlan.outlineWalls', [], /one wall for each side/],
  ['a corner of three coordinates', 'floorPlan.outline[1]', [1, 2, 3], /2 entries or fewer/],
  ['a corner of one coordinate', 'floorPlan.outline[1]', [1], /2 entries or more/],
  ['a corner that is text', 'floorPlan.outline[1][0]', '6', /coordinate must be a number/],
  ['a corner beyond any room', 'floorPlan.outline[1][0]', 501, /500 or less/],
  ['a ceiling on the floor', 'ceiling', 1, /at least 1.5 m/],
  ['a ceiling in the clouds', 'ceiling', 21, /20 or less/],
  ['an inner wall of no thickness', 'floorPlan.innerWalls[0].thickness', 0, /needs a thickness/],
  ['an opening in a wall of no name', `${opening}.wall`, 'outline:', /outline:<edge>/],
  ['an opening that ends where it starts', `${opening}.to`, 1.5, /end after it starts/],
  ['an opening upside down', `${opening}.sill`, 2.2, /higher than the sill/, `${opening}.head`],
  ['an opening that is neither', `${opening}.kind`, 'hatch', /^Must be one of: door, window$/],
  ['a door that is open a little', `${opening}.open`, 0.5, /true or false, not a number/],
  ['glazing that gives light', `${opening}.transmittance`, 1.1, /1 or less/],
  ['furniture of no parts', 'floorPlan.furniture[0].parts', [], /at least one part/],
  [
    'a part of two corners',
    `${part}.footprint`,
    [
      [0, 0],
      [1, 1],
    ],
    /at least 3 corners/,
  ],
  ['a part of no height', `${part}.top`, 0.2, /higher than the underside/],
  ['a part below the floor', `${part}.base`, -0.1, /below the floor/],
  ['a touch point that looks over its shoulder', 'floorPlan.touchPoints[0].tilt', 91, /90 or less/],
  ['an id with a blank in it', `${watch}.id`, 'a b', /letters, digits/],
  ['an id as long as a name', `${watch}.id`, 'x'.repeat(41), /1 to 40/],
  ['a name of blanks', `${watch}.name`, '   ', /Give it a name/],
  ['a name as long as a letter', `${watch}.name`, 'x'.repeat(81), /80 characters/],
  ['a name that cuts itself short', `${watch}.name`, 'cor\u0000ridor', /control characters/],
  ['a name with half a character', `${watch}.name`, 'bed \ud83d', /half characters/],
  ['a name of two lines', `${watch}.name`, 'a\nb', /control characters/],
  ...noNumbers.map(
    ([what, value]) =>
      [`a height of ${what}`, 'floorPlan.touchPoints[0].height', value, /must be a number/] as const,
  ),
]);
