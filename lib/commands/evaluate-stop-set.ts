import {
  addDose,
  coverage,
  doseReached,
  findGaps,
  type GapCause,
  gapCauses,
  irradianceAt,
  irradianceMap,
  passDoseAt,
  passDoseMap,
  planeSurface,
  prepareScene,
  UndefinedReadingError,
} from '@/lib/engine';
import {
  litPlanOf,
  placedTouchPoints,
  type RoomFile,
  requiredDose,
  timesOf,
  toScene,
  toSpot,
} from '@/lib/room';

/** The figures of one stop set of a room file, as `npm run evaluate` prints them. SI units; ratios are dose ÷ (target × margin). */
export interface Evaluation {
  readonly room: string;
  readonly stopSet: string;
  readonly surface: { readonly kind: 'plane'; readonly z: number };
  /** Grid step, metres. */
  readonly grid: number;
  readonly cells: number;
  /** Share of the cells, 0 to 1. */
  readonly targetMet: number;
  readonly lowestRatio: number;
  readonly p5Ratio: number;
  readonly lampOnSeconds: number;
  readonly movingSeconds: number;
  readonly totalSeconds: number;
  readonly gaps: readonly {
    readonly number: number;
    readonly area: number;
    readonly lowestRatio: number;
    readonly cause: GapCause;
  }[];
  readonly touchPoints: readonly { readonly name: string; readonly dose: number; readonly ratio: number }[];
}

export interface EvaluateOptions {
  /** Id of a stop set; the first one unless said. */
  readonly stopSet?: string;
  /** Height of the plane, metres. */
  readonly plane: number;
  /** Grid step, metres. */
  readonly grid: number;
}

/** Throws an Error in words when the file has no such stop set. */
export function evaluateStopSet(file: RoomFile, options: EvaluateOptions): Evaluation {
  const set = options.stopSet ? file.stopSets.find(({ id }) => id === options.stopSet) : file.stopSets[0];
  if (!set) {
    const known = file.stopSets.map(({ id }) => id).join(', ') || 'none';
    throw new Error(
      options.stopSet
        ? `The file has no stop set "${options.stopSet}". It has: ${known}.`
        : 'The file has no stop set to evaluate.',
    );
  }
  const { scene, outline, voids } = toScene(file.floorPlan);
  const prepared = prepareScene(scene);
  const surface = planeSurface({
    outline,
    voids,
    solids: scene.solids,
    step: options.grid,
    z: options.plane,
  });
  const { stops, passes } = litPlanOf(set, file.emitters);
  const dose = new Float32Array(surface.mask.length);
  for (const { placement, dwell } of stops) addDose(dose, irradianceMap(prepared, placement, surface), dwell);
  for (const pass of passes) addDose(dose, passDoseMap(prepared, pass, surface), 1);

  const target = requiredDose(set);
  const covered = coverage(surface, dose, target);
  const found = findGaps(
    surface,
    dose.map((value) => value / target),
  );
  const causes = gapCauses({ scene, stops, passes, surface, dose, target, ...found }).gapCauses;
  const times = timesOf(set, file.emitters);
  /** A touch point inside a lamp has no reading from it, and counts none. */
  const counted = (read: () => number): number => {
    try {
      return read();
    } catch (error) {
      if (error instanceof UndefinedReadingError) return 0;
      throw error;
    }
  };
  return {
    room: file.room.name,
    stopSet: set.name,
    surface: { kind: 'plane', z: options.plane },
    grid: options.grid,
    cells: covered.cells,
    targetMet: covered.share,
    lowestRatio: covered.lowestRatio,
    p5Ratio: doseReached(surface, dose, 0.05) / target,
    lampOnSeconds: times.lampOn,
    movingSeconds: times.moving,
    totalSeconds: times.total,
    gaps: found.gaps.map(({ number, area, lowestRatio }, i) => ({
      number,
      area,
      lowestRatio,
      cause: causes[i],
    })),
    touchPoints: placedTouchPoints(file.floorPlan).map((touch) => {
      const receiver = { ...toSpot(touch), mode: 'normal' as const };
      const sum =
        stops.reduce(
          (total, { placement, dwell }) =>
            total + dwell * counted(() => irradianceAt(prepared, placement, receiver)),
          0,
        ) + passes.reduce((total, pass) => total + counted(() => passDoseAt(prepared, pass, receiver)), 0);
      const { pieceName, point } = touch;
      return { name: pieceName ? `${pieceName}: ${point.name}` : point.name, dose: sum, ratio: sum / target };
    }),
  };
}
