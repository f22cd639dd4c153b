import type { Emitters } from './schema/emitter';
import type { FloorPlan } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';
import type { StopSet } from './schema/stop-set';
import { tapesTo } from './tape';
import { emitterOf } from './times';

const columns = [
  'order',
  'name',
  'kind',
  'from_wall_1',
  'distance_1_m',
  'from_wall_2',
  'distance_2_m',
  'heading_deg',
  'dwell_s',
  'speed_m_s',
  'emitter',
] as const;

/** RFC 4180 quoting; a leading = + - @ or tab is defused so that a spreadsheet does not take a name for a formula. */
function cell(value: string | number): string {
  if (typeof value === 'number') return String(value);
  const text = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

/** Rounded for a tape or a clock, without trailing noise. */
const rounded = (value: number, digits: number): number => Number(value.toFixed(digits));

/**
 * The stop sequence a crew follows, as CSV (RFC 4180, CRLF): stops in order, then passes. A stop is measured
 * to its mark; a pass to where it starts. Distances to the nearest centimetre.
 */
export function stopSequenceCsv(
  set: StopSet,
  plan: Pick<FloorPlan, 'outline' | 'outlineWalls' | 'innerWalls'>,
  emitters: Emitters,
): string {
  const measured = (mark: PlanPoint) => {
    const [first, second] = tapesTo(plan, mark);
    return [
      first?.wall ?? '',
      first?.distance.toFixed(2) ?? '',
      second?.wall ?? '',
      second?.distance.toFixed(2) ?? '',
    ];
  };
  const stops = set.stops.map((stop, i) => [
    i + 1,
    stop.name,
    'stop',
    ...measured(stop.at),
    rounded(stop.heading, 1),
    rounded(stop.dwell, 1),
    '',
    emitterOf(set, stop, emitters)?.name ?? stop.emitter ?? set.emitter,
  ]);
  const passes = set.passes.map((pass, i) => [
    set.stops.length + i + 1,
    pass.name,
    'pass',
    ...measured(pass.path[0]),
    pass.heading === null ? '' : rounded(pass.heading, 1),
    '',
    rounded(pass.speed, 4),
    emitterOf(set, pass, emitters)?.name ?? pass.emitter ?? set.emitter,
  ]);
  return [columns, ...stops, ...passes].map((row) => `${row.map(cell).join(',')}\r\n`).join('');
}
