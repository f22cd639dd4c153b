import { addDose, coverage } from '@/lib/engine';
import {
  type Emitters,
  type FloorPlanDocument,
  type Lamp,
  lampsOf,
  litPlanOf,
  placedTouchPoints,
  requiredDose,
  type StopSet,
  toScene,
  toSpot,
} from '@/lib/room';
import { type DosePool, Superseded } from '@/workers/pool';
import type { GapsReport, LampField, MapSurface, RoomJob, SurfaceChoice } from '@/workers/protocol';

export interface DoseInput {
  readonly document: FloorPlanDocument;
  readonly set: StopSet;
  readonly emitters: Emitters;
  readonly surface: SurfaceChoice;
  /** Grid step, metres. */
  readonly step: number;
}

/** A touch point's name, and what it gets. */
export interface TouchDose {
  readonly id: string;
  readonly name: string;
  /** J/m² */
  readonly dose: number;
  /** Dose ÷ target. */
  readonly ratio: number;
}

export interface DosePicture {
  readonly surface: MapSurface;
  /** Dose ÷ target, a cell each. */
  readonly ratio: Float32Array;
  /** J/m² a cell. */
  readonly dose: Float32Array;
  /** What each stop and pass gives, by id, with its weight: the shares under the pointer. */
  readonly shares: readonly { readonly lamp: Lamp; readonly map: Float32Array }[];
  readonly coverage: ReturnType<typeof coverage>;
  readonly touchPoints: readonly TouchDose[];
}

export interface DoseView {
  readonly picture: DosePicture | null;
  /** Gaps of `picture`, or of a slightly older one while `pending` is not 0. */
  readonly gaps: GapsReport | null;
  /** Maps still to come, of how many that were asked for. */
  readonly pending: number;
  readonly asked: number;
  readonly failure: string | null;
  /** The stop set that picture and gaps both belong to; `null` while either is still to come. */
  readonly settledFor: StopSet | null;
}

export const nothingYet: DoseView = {
  picture: null,
  gaps: null,
  pending: 1,
  asked: 1,
  failure: null,
  settledFor: null,
};

interface HeldField {
  readonly key: string;
  readonly field: LampField;
}

/**
 * Keeps the dose picture of what is on the sheet: one field a stop or pass, asked of the workers only when that one
 * moved; a dwell or a speed only re-adds. The picture is renewed as fields come in, the gaps once nothing is pending.
 */
export class DoseSession {
  private view: DoseView = nothingYet;
  private input: DoseInput | null = null;
  private room: RoomJob | null = null;
  private surface: MapSurface | null = null;
  private fields = new Map<string, HeldField>();
  private inFlight = new Map<string, string>();
  /** What the picture was added up from, and what the gaps were explained for. */
  private painted = '';
  private explained = '';
  private rooms = 0;
  private readonly listeners = new Set<() => void>();

  constructor(private readonly pool: DosePool) {}

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly getView = (): DoseView => this.view;

  close(): void {
    this.listeners.clear();
    this.pool.close();
  }

  /** Shows `input` from now on. Cheap when little has changed. */
  show(input: DoseInput): void {
    const before = this.input;
    this.input = input;
    const sameRoom =
      before?.document === input.document &&
      before.step === input.step &&
      JSON.stringify(before.surface) === JSON.stringify(input.surface);
    if (!sameRoom) void this.openRoom(input);
    else if (this.surface) this.renew();
  }

  private async openRoom({ document, surface, step }: DoseInput): Promise<void> {
    const { scene, outline, voids } = toScene(document.floorPlan);
    const spots = placedTouchPoints(document.floorPlan).map(toSpot);
    this.rooms += 1;
    const key = `room-${this.rooms}`;
    const room: RoomJob = { key, scene, outline, voids, ceiling: document.ceiling, spots, surface, step };
    this.room = room;
    this.surface = null;
    this.fields = new Map();
    this.inFlight = new Map();
    this.painted = '';
    this.explained = '';
    this.say({ pending: 1, asked: 1, failure: null, settledFor: null });
    try {
      const cells = await this.pool.surface(room);
      if (this.room !== room) return;
      this.surface = cells;
      // What was shown belongs to other cells.
      this.say({ picture: null, gaps: null });
      this.renew();
    } catch (error) {
      this.fail(error, room);
    }
  }

  /** Asks for the fields that are missing or old, and shows what there is. */
  private renew(): void {
    const { input, room } = this;
    if (!input || !room || !this.surface) return;
    const lamps = lampsOf(input.set, input.emitters);
    const alive = new Set(lamps.map(({ id }) => id));
    for (const id of this.fields.keys()) if (!alive.has(id)) this.fields.delete(id);
    for (const id of this.inFlight.keys()) if (!alive.has(id)) this.inFlight.delete(id);
    for (const { id, job } of lamps) {
      const key = JSON.stringify(job);
      if (this.fields.get(id)?.key === key) {
        // Back where it was: what is still on its way is of no use.
        this.inFlight.delete(id);
        continue;
      }
      if (this.inFlight.get(id) === key) continue;
      this.inFlight.set(id, key);
      this.pool
        .light(id, room, job)
        .then((field) => this.receive(room, id, key, field))
        .catch((error) => this.fail(error, room));
    }
    this.repaint();
  }

  private receive(room: RoomJob, id: string, key: string, field: LampField): void {
    if (this.room !== room || !this.inFlight.has(id)) return;
    this.fields.set(id, { key, field });
    if (this.inFlight.get(id) === key) this.inFlight.delete(id);
    this.repaint();
  }

  /** Adds the fields up. No ray is cast here. */
  private repaint(): void {
    const { input, surface, room } = this;
    if (!input || !surface || !room) return;
    const target = requiredDose(input.set);
    const pending = this.inFlight.size;
    // A half-filled picture would show gaps that are only not there yet.
    if (!this.view.picture && pending > 0) {
      this.say({ pending, asked: Math.max(pending, this.view.asked) });
      return;
    }
    const lamps = lampsOf(input.set, input.emitters);
    const parts = JSON.stringify([
      target,
      lamps.map(({ id, weight }) => [id, this.fields.get(id)?.key, weight]),
    ]);
    if (this.view.picture && parts === this.painted) {
      // Nothing to add up anew: a stop is on its way, or a name has changed.
      const settled = pending === 0 && parts === this.explained;
      this.say({
        pending,
        asked: Math.max(pending, this.view.asked),
        settledFor: settled ? input.set : null,
      });
      return;
    }
    this.painted = parts;
    const dose = new Float32Array(surface.mask.length);
    const touched = new Float64Array(room.spots.length);
    const shares = lamps.flatMap((lamp) => {
      const held = this.fields.get(lamp.id);
      if (!held) return [];
      addDose(dose, held.field.map, lamp.weight);
      held.field.spots.forEach((value, i) => {
        touched[i] += value * lamp.weight;
      });
      return [{ lamp, map: held.field.map }];
    });
    this.say({
      picture: {
        surface,
        dose,
        shares,
        ratio: dose.map((value) => value / target),
        coverage: coverage(surface, dose, target),
        touchPoints: placedTouchPoints(input.document.floorPlan).map(({ point, pieceName }, i) => ({
          id: point.id,
          name: pieceName ? `${pieceName}: ${point.name}` : point.name,
          dose: touched[i],
          ratio: touched[i] / target,
        })),
      },
      pending,
      asked: Math.max(pending, this.view.asked),
    });
    if (pending === 0) void this.explain(room, dose, target, parts);
  }

  private async explain(room: RoomJob, dose: Float32Array, target: number, parts: string): Promise<void> {
    const { input } = this;
    if (!input) return;
    try {
      const gaps = await this.pool.gaps(room, litPlanOf(input.set, input.emitters), dose, target);
      if (this.room !== room || this.painted !== parts) return;
      this.explained = parts;
      // By now the set may have other names; as long as nothing is pending it has these gaps.
      this.say({ gaps, asked: 0, settledFor: this.inFlight.size === 0 ? (this.input?.set ?? null) : null });
    } catch (error) {
      this.fail(error, room);
    }
  }

  private fail(error: unknown, room: RoomJob): void {
    if (error instanceof Superseded || this.room !== room) return;
    this.inFlight.clear();
    this.say({ pending: 0, asked: 0, failure: error instanceof Error ? error.message : String(error) });
  }

  private say(change: Partial<DoseView>): void {
    this.view = { ...this.view, ...change };
    for (const listener of this.listeners) listener();
  }
}
