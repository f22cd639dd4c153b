/**
 * npm run bench [-- --json]: what the dose engine takes on this machine, on one core, beside its yardsticks: the open field
 * (same grid and stops, nothing in them) and a triangle ray caster at 16 samples a tube. Prints, asserts nothing.
 */
import { readFileSync } from 'node:fs';
import {
  type Emitter,
  irradianceAt,
  irradianceMap,
  type Placement,
  type Point,
  planeSurface,
  prepareScene,
  type Scene,
  sumDose,
} from '@/lib/engine';
import { bvhOf, sampledMap } from './bvh-caster';
import { type Timing, time } from './timing';

const GRID = 0.05;
const SECONDS = 300;
/** Cells the ray caster is timed on, spread evenly; its time is scaled up from them. */
const SAMPLED_CELLS = 400;

const gyms = [15, 60, 240] as const;
const kinds = ['tower', 'bank'] as const;

interface GymFile {
  readonly outline: Point[];
  readonly scene: Scene & { readonly emitters: Readonly<Record<string, Emitter>> };
  readonly stops: readonly { readonly x: number; readonly y: number; readonly heading_deg: number }[];
}

const loadGym = (parts: number): GymFile =>
  JSON.parse(readFileSync(`tests/fixtures/bench/gym-${String(parts).padStart(3, '0')}.json`, 'utf8'));

function benchGym(parts: number, kind: (typeof kinds)[number]) {
  const gym = loadGym(parts);
  const emitter = gym.scene.emitters[kind];
  if (!emitter) throw new Error(`The gym of ${parts} parts has no emitter "${kind}".`);
  const scene: Scene = {
    solids: gym.scene.solids,
    walls: gym.scene.walls.map((wall) => ({ ...wall, openings: [] })),
  };
  const surface = planeSurface({ outline: gym.outline, solids: scene.solids, step: GRID, z: 0 });
  const stops: Placement[] = gym.stops.map(({ x, y, heading_deg }) => ({
    emitter,
    x,
    y,
    headingDeg: heading_deg,
  }));
  const prepared = prepareScene(scene);
  const openField = prepareScene({ solids: [], walls: [] });
  const maps = stops.map(() => new Float32Array(surface.mask.length));
  const allMaps = (field: typeof prepared) => () => {
    stops.forEach((placement, s) => {
      irradianceMap(field, placement, surface, maps[s]);
    });
    return maps[0][12_345];
  };
  const runs = kind === 'tower' ? { runs: 12, warmUps: 3 } : { runs: 4, warmUps: 1 };
  const open = time(allMaps(openField), runs);
  // Collected first where that is possible (--expose-gc), so that growth is what the runs themselves leave behind.
  globalThis.gc?.();
  const heapBefore = process.memoryUsage().heapUsed;
  const furnished = time(allMaps(prepared), runs);
  const heapGrowth = process.memoryUsage().heapUsed - heapBefore;
  const oneMoved = time(() => irradianceMap(prepared, stops[3], surface, maps[3])[500], runs);
  const dose = new Float32Array(surface.mask.length);
  const dwells = stops.map((_, s) => SECONDS + s);
  const dwellChange = time(() => sumDose(maps, dwells, dose)[12_345], { runs: 60, warmUps: 20 });

  const counted = [...surface.mask.keys()].filter((cell) => surface.mask[cell] === 1);
  const cells = Array.from(
    { length: SAMPLED_CELLS },
    (_, i) => counted[Math.floor(((i + 0.5) / SAMPLED_CELLS) * counted.length)],
  );
  const bvh = bvhOf(scene);
  const caster = time(
    () => stops.reduce((sum, placement) => sum + sampledMap(bvh, placement, surface, cells)[0], 0),
    { runs: 2, warmUps: 1 },
  );
  const casterMs = (caster.min * counted.length) / SAMPLED_CELLS;
  return {
    parts,
    kind,
    cells: counted.length,
    stops: stops.length,
    open,
    furnished,
    oneMoved,
    dwellChange,
    heapGrowthKilobytes: Math.round(heapGrowth / 1024),
    timesOpenField: furnished.min / open.min,
    caster: { milliseconds: casterMs, ...casterErrors(stops, cells) },
    fasterThanCaster: casterMs / furnished.min,
  };

  /** How far off the sampled dose is, where there is any: median and 95th percentile. */
  function casterErrors(lamps: readonly Placement[], spots: readonly number[]) {
    const sampled = new Float64Array(spots.length);
    for (const placement of lamps)
      sampledMap(bvh, placement, surface, spots).forEach((value, k) => {
        sampled[k] += value;
      });
    const errors = spots
      .map((cell, k) => {
        const p = [
          surface.originX + ((cell % surface.columns) + 0.5) * GRID,
          surface.originY + (Math.floor(cell / surface.columns) + 0.5) * GRID,
          0,
        ] as const;
        const exact = lamps.reduce(
          (sum, placement) => sum + irradianceAt(prepared, placement, { p, mode: 'normal', n: [0, 0, 1] }),
          0,
        );
        return exact === 0 ? null : Math.abs(sampled[k] / exact - 1);
      })
      .filter((error) => error !== null)
      .sort((one, two) => one - two);
    return {
      medianError: errors[Math.floor(errors.length / 2)],
      p95Error: errors[Math.floor(errors.length * 0.95)],
    };
  }
}

type Result = ReturnType<typeof benchGym>;

const ms = ({ min, mean, sd }: Timing) => `${min.toFixed(1)} ms (${mean.toFixed(1)} ± ${sd.toFixed(1)})`;
const percent = (share: number) => `${(share * 100).toFixed(1)} %`;

function print(results: readonly Result[]): void {
  const of = (parts: number, kind: string) => {
    const found = results.find((result) => result.parts === parts && result.kind === kind);
    if (!found) throw new Error(`Nothing was measured for ${parts} parts and the ${kind}.`);
    return found;
  };
  for (const r of results) {
    console.log(`gym, ${r.parts} parts, ${r.kind}: ${r.cells} cells, ${r.stops} stops`);
    console.log(`  all maps      ${ms(r.furnished)}, ${r.timesOpenField.toFixed(2)} × the open field`);
    console.log(`  open field    ${ms(r.open)}`);
    console.log(`  one stop      ${ms(r.oneMoved)}`);
    console.log(`  dwell change  ${ms(r.dwellChange)}`);
    console.log(`  heap growth   ${r.heapGrowthKilobytes} kB over ${r.furnished.runs} runs`);
    console.log(
      `  ray caster    ${(r.caster.milliseconds / 1000).toFixed(1)} s (scaled from ${SAMPLED_CELLS} cells), ` +
        `${Math.round(r.fasterThanCaster)} × slower, off by ${percent(r.caster.medianError)} at the median, ${percent(r.caster.p95Error)} at the 95th percentile`,
    );
  }
  const growth = (kind: string) => of(240, kind).furnished.min / of(60, kind).furnished.min;
  console.log('\naims');
  console.log(
    `  tower, 60 parts, at most 3 × its open field:    ${of(60, 'tower').timesOpenField.toFixed(2)}`,
  );
  console.log(
    `  bank, 60 parts, at most 4 × its open field:     ${of(60, 'bank').timesOpenField.toFixed(2)}`,
  );
  console.log(`  tower, 240 parts, less than twice 60 parts:     ${growth('tower').toFixed(2)}`);
  console.log(`  bank, 240 parts, less than twice 60 parts:      ${growth('bank').toFixed(2)}`);
  console.log(
    `  tower, at least 500 × faster than the caster:   ${Math.round(of(60, 'tower').fasterThanCaster)}`,
  );
  console.log(
    `  eight maps re-added in under 4 ms:              ${of(60, 'tower').dwellChange.min.toFixed(2)} ms`,
  );
}

const results = gyms.flatMap((parts) => kinds.map((kind) => benchGym(parts, kind)));
if (process.argv.includes('--json')) console.log(JSON.stringify(results, null, 2));
else print(results);
