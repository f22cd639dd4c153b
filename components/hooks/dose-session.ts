import { addDose, coverage } from '@/lib/engine';
import type { GridSurface } from '@/lib/engine/types';
import {
  type Emitters,
  emitterOf,
  type FloorPlan,
  requiredDose,
  type StopSet,
  toPlacement,
  toScene,
} from '@/lib/room';
import { type DosePool, Superseded } from '@/workers/pool';
import type { GapsReport, RoomJob, SurfaceChoice, TimedPlacement } from '@/workers/protocol';

export interface DoseInput {
  readonly plan: FloorPlan;
  readonly set: StopSet;
  readonly emitters: Emitters;
  readonly surface: SurfaceChoice;
  /** Grid step, metres. */
  readonly step: number;
}

export interface DosePicture {
  readonly surface: GridSurface;
  /** Dose ÷ target, a cell each. */
  readonly ratio: Float32Array;
  /** J/m² a cell. */
  readonly dose: Float32Array;
  /** W/m² a cell, by stop id: the shares under the pointer. */
  readonly maps: ReadonlyMap<string, Float32Array>;
  readonly coverage: ReturnType<typeof coverage>;
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

interface StopMap {
  readonly placementKey: string;
  readonly map: Float32Array;
}

/**
 * Keeps the dose picture of what is on the sheet: one map a stop, asked of the workers only when that stop
 * moved; a dwell only re-adds. The picture is renewed as maps come in, the gaps once nothing is pending.
 */
export class DoseSession {
  private view: DoseView = {
    picture: null,
    gaps: null,
    pending: 0,
    asked: 0,
    failure: null,
    settledFor: null,
  };
  private input: DoseInput | null = null;
  private planOfRoom: FloorPlan | null = null;
  private room: RoomJob | null = null;
  private surface: GridSurface | null = null;
  private maps = new Map<string, StopMap>();
  private inFlight = new Map<string, string>();
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
    if (
      this.planOfRoom !== input.plan ||
      before?.step !== input.step ||
      JSON.stringify(before.surface) !== JSON.stringify(input.surface)
    ) {
      void this.openRoom(input);
    } else if (this.surface) {
      this.renew();
    }
  }

  private async openRoom({ plan, surface, step }: DoseInput): Promise<void> {
    const { scene, outline, voids } = toScene(plan);
    this.rooms += 1;
    const room: RoomJob = { key: `room-${this.rooms}`, scene, outline, voids, surface, step };
    this.planOfRoom = plan;
    this.room = room;
    this.surface = null;
    this.maps = new Map();
    this.inFlight = new Map();
    this.say({ pending: 1, asked: 1, failure: null, settledFor: null });
    try {
      const grid = await this.pool.surface(room);
      if (this.room !== room) return;
      this.surface = grid;
      this.renew();
    } catch (error) {
      this.fail(error, room);
    }
  }

  /** Asks for the maps that are missing or old, and shows what there is. */
  private renew(): void {
    const { input, room } = this;
    if (!input || !room || !this.surface) return;
    const alive = new Set(input.set.stops.map((stop) => stop.id));
    for (const id of this.maps.keys()) if (!alive.has(id)) this.maps.delete(id);
    for (const id of this.inFlight.keys()) if (!alive.has(id)) this.inFlight.delete(id);
    for (const stop of input.set.stops) {
      const emitter = emitterOf(input.set, stop, input.emitters);
      if (!emitter) continue;
      const placement = toPlacement(stop, emitter);
      const key = JSON.stringify(placement);
      if (this.maps.get(stop.id)?.placementKey === key || this.inFlight.get(stop.id) === key) continue;
      this.inFlight.set(stop.id, key);
      this.pool
        .irradiance(stop.id, room, placement)
        .then((map) => this.receive(room, stop.id, key, map))
        .catch((error) => this.fail(error, room));
    }
    this.repaint();
  }

  private receive(room: RoomJob, stopId: string, placementKey: string, map: Float32Array): void {
    if (this.room !== room || !this.inFlight.has(stopId)) return;
    this.maps.set(stopId, { placementKey, map });
    if (this.inFlight.get(stopId) === placementKey) this.inFlight.delete(stopId);
    this.repaint();
  }

  /** Adds the maps up. No ray is cast here. */
  private repaint(): void {
    const { input, surface, room } = this;
    if (!input || !surface || !room) return;
    const target = requiredDose(input.set);
    const dose = new Float32Array(surface.columns * surface.rows);
    for (const stop of input.set.stops) {
      const held = this.maps.get(stop.id);
      if (held) addDose(dose, held.map, stop.dwell);
    }
    const ratio = dose.map((value) => value / target);
    const pending = this.inFlight.size;
    const first = !this.view.picture;
    // A half-filled picture would show gaps that are only not there yet.
    if (first && pending > 0) {
      this.say({ pending, asked: input.set.stops.length });
      return;
    }
    this.say({
      picture: {
        surface,
        dose,
        ratio,
        maps: new Map([...this.maps].map(([id, held]) => [id, held.map])),
        coverage: coverage(surface, dose, target),
      },
      pending,
      asked: Math.max(pending, this.view.asked),
    });
    if (pending === 0) void this.explain(room, dose, target);
  }

  private async explain(room: RoomJob, dose: Float32Array, target: number): Promise<void> {
    const { input } = this;
    if (!input) return;
    const stops: TimedPlacement[] = input.set.stops.flatMap((stop) => {
      const emitter = emitterOf(input.set, stop, input.emitters);
      return emitter ? [{ placement: toPlacement(stop, emitter), dwell: stop.dwell }] : [];
    });
    try {
      const gaps = await this.pool.gaps(room, stops, dose, target);
      if (this.room === room && this.view.picture?.dose === dose)
        this.say({ gaps, asked: 0, settledFor: input.set });
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
