import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Emitter, Pass, Placement, Point, ReadingMode, Scene, Vector3 } from '@/lib/engine';

/** A reference case as its file holds it; the format is described in tests/fixtures/cases/README.md. */
interface CaseFile {
  readonly id: string;
  readonly title: string;
  readonly scene: {
    readonly solids: readonly { polygon: Point[]; base: number; top: number }[];
    readonly walls: readonly {
      a: Point;
      b: Point;
      openings: { from: number; to: number; sill: number; head: number; open: boolean }[];
    }[];
    readonly emitters: Readonly<Record<string, Emitter>>;
  };
  readonly stops: readonly { emitter: string; x: number; y: number; heading_deg: number; dwell_s: number }[];
  readonly passes?: readonly { emitter: string; path: Point[]; speed: number; heading_deg: number | null }[];
  readonly receivers: readonly { p: Vector3; mode: ReadingMode; n?: Vector3 }[];
  readonly expected: {
    readonly irradiance: readonly (readonly number[])[];
    readonly dose: readonly number[];
    readonly pass_leg_dose?: readonly (readonly (readonly number[])[])[];
  };
}

/** A reference case in the engine's shapes. */
export interface ReferenceCase {
  readonly id: string;
  readonly title: string;
  readonly scene: Scene;
  readonly stops: readonly { readonly placement: Placement; readonly dwell: number }[];
  readonly passes: readonly Pass[];
  readonly receivers: CaseFile['receivers'];
  readonly expected: CaseFile['expected'];
}

export function readCases(directory: string): ReferenceCase[] {
  const names = readdirSync(directory).filter((name) => name.endsWith('.json'));
  if (names.length === 0) throw new Error(`No case files (*.json) in ${directory}.`);
  return names.sort().map((name) => readCase(join(directory, name)));
}

export function readCase(path: string): ReferenceCase {
  const file = JSON.parse(readFileSync(path, 'utf8')) as CaseFile;
  const emitterOf = (key: string): Emitter => {
    const emitter = file.scene.emitters[key];
    if (!emitter) throw new Error(`${path}: no emitter called "${key}".`);
    return emitter;
  };
  return {
    id: file.id,
    title: file.title,
    scene: {
      solids: file.scene.solids,
      walls: file.scene.walls.map(({ a, b, openings }) => ({
        a,
        b,
        openings: openings.map(({ open, ...hole }) => ({ ...hole, transmittance: open ? 1 : 0 })),
      })),
    },
    stops: file.stops.map(({ emitter, x, y, heading_deg, dwell_s }) => ({
      placement: { emitter: emitterOf(emitter), x, y, headingDeg: heading_deg },
      dwell: dwell_s,
    })),
    passes: (file.passes ?? []).map(({ emitter, path, speed, heading_deg }) => ({
      emitter: emitterOf(emitter),
      path,
      speed,
      headingDeg: heading_deg,
    })),
    receivers: file.receivers,
    expected: file.expected,
  };
}
