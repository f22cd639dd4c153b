import { addDose } from './dose';
import { causesFromDoses, type TimedStop } from './gap-causes';
import { findGaps, SMALLEST_GAP } from './gaps';
import { passDoseStrip } from './pass-dose-map';
import { prepareScene } from './prepare-scene';
import { irradianceStrip, type SideStrip, stripPoint } from './side-strips';
import type { GapCause, Pass, Scene } from './types';

/** One connected under-dosed zone of an upright face. */
export interface SideGap {
  /** 1 for the largest of all faces. */
  readonly number: number;
  /** Index into the strips. */
  readonly strip: number;
  /** m² */
  readonly area: number;
  readonly lowestRatio: number;
  readonly cause: GapCause;
  /** Plan position of a spot well inside it. */
  readonly x: number;
  readonly y: number;
}

export interface SideGapReport {
  readonly gaps: readonly SideGap[];
  /** m² of zones too small to number. */
  readonly specksArea: number;
  /** Gap number of every cell, strip after strip; 0 for none, −1 for specks. */
  readonly labels: Int32Array;
}

/** Cells of strips follow each other in one field; where each strip begins, and the length of all. */
export function stripStarts(strips: readonly SideStrip[]): number[] {
  const starts = [0];
  for (const { columns, rows } of strips) starts.push(starts[starts.length - 1] + columns * rows);
  return starts;
}

/** One field over all strips. */
export function stripField(
  strips: readonly SideStrip[],
  fieldOf: (strip: SideStrip) => Float32Array,
): Float32Array {
  const starts = stripStarts(strips);
  const out = new Float32Array(starts[strips.length]);
  strips.forEach((strip, k) => {
    out.set(fieldOf(strip), starts[k]);
  });
  return out;
}

/** Gaps of upright faces with their causes. `dose` is J/m² a cell, strip after strip; `target` J/m². */
export function sideGaps({
  scene,
  strips,
  stops,
  passes,
  dose,
  target,
}: {
  readonly scene: Scene;
  readonly strips: readonly SideStrip[];
  readonly stops: readonly TimedStop[];
  readonly passes: readonly Pass[];
  readonly dose: Float32Array;
  readonly target: number;
}): SideGapReport {
  const starts = stripStarts(strips);
  const labels = new Int32Array(starts[strips.length]);
  let specksArea = 0;
  const zones = strips.flatMap((strip, k) => {
    const own = dose.subarray(starts[k], starts[k + 1]);
    // Cells of a strip need not be square; only their area counts here.
    const step = Math.sqrt(strip.cellWidth * strip.cellHeight);
    const found = findGaps(
      { ...strip, originX: 0, originY: 0, step, z: 0 },
      own.map((value) => value / target),
      { smallest: SMALLEST_GAP },
    );
    specksArea += found.specksArea;
    return found.gaps.map((gap) => ({ ...gap, strip: k, found: found.labels, step }));
  });
  const numbered = zones.sort((one, two) => two.area - one.area);
  numbered.forEach(({ strip, number, found }, i) => {
    found.forEach((label, cell) => {
      if (label === number) labels[starts[strip] + cell] = i + 1;
      else if (label < 0) labels[starts[strip] + cell] = -1;
    });
  });

  const under = strips.map((strip, k) => ({
    ...strip,
    mask: strip.mask.map((counts, cell) => (counts !== 0 && dose[starts[k] + cell] < target ? 1 : 0)),
  }));
  const doseIn = (without: Scene): Float32Array => {
    const prepared = prepareScene(without);
    return stripField(under, (strip) => {
      const sum = new Float32Array(strip.columns * strip.rows);
      if (!strip.mask.includes(1)) return sum;
      for (const { placement, dwell } of stops)
        addDose(sum, irradianceStrip(prepared, placement, strip), dwell);
      for (const pass of passes) addDose(sum, passDoseStrip(prepared, pass, strip), 1);
      return sum;
    });
  };
  const furnitureOut = doseIn({ solids: [], walls: scene.walls });
  const allOut = scene.walls.length === 0 ? furnitureOut : doseIn({ solids: [], walls: [] });
  const mask = new Uint8Array(labels.length);
  strips.forEach((strip, k) => {
    mask.set(strip.mask, starts[k]);
  });
  const gaps = numbered.map((gap, i) => ({ ...gap, number: i + 1 }));
  const { gapCauses } = causesFromDoses(
    { surface: { mask }, dose, target, gaps, labels },
    furnitureOut,
    allOut,
  );
  return {
    labels,
    specksArea,
    gaps: gaps.map(({ number, strip, area, lowestRatio, x, y, step }, i) => {
      const face = strips[strip];
      const [px, py] = stripPoint(face, Math.floor(x / step), Math.floor(y / step));
      return { number, strip, area, lowestRatio, cause: gapCauses[i], x: px, y: py };
    }),
  };
}
