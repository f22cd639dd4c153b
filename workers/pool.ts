import * as Comlink from 'comlink';
import type { DoseWorker, GapsReport, LampField, LampJob, LitPlan, MapSurface, RoomJob } from './protocol';

/** A newer request took this one's place. Not a failure: whoever asked has asked again. */
export class Superseded extends Error {
  override readonly name = 'Superseded';
}

interface Job {
  readonly slot: string;
  readonly room: RoomJob;
  readonly work: (worker: Comlink.Remote<DoseWorker>) => Promise<unknown>;
  readonly resolve: (answer: unknown) => void;
  readonly reject: (reason: Error) => void;
}

interface Seat {
  readonly thread: Worker;
  readonly remote: Comlink.Remote<DoseWorker>;
  /** The room this worker holds. */
  roomKey: string | null;
  job: Job | null;
}

/** Most that is worth starting: the maps of one room are a handful of short jobs. */
const MOST_WORKERS = 4;

/**
 * A bounded pool of dose workers. Jobs have a slot (one a stop or pass): within a slot they run one after the
 * other, and a waiting job gives way to a newer one, so a dragged stop always shows its newest finished
 * map and nothing piles up. A worker that dies fails its job with words and is replaced.
 */
export class DosePool {
  private readonly seats: Seat[];
  private readonly waiting = new Map<string, Job>();

  constructor(
    private readonly startThread: () => Worker,
    size = Math.max(1, Math.min(navigator.hardwareConcurrency || 1, MOST_WORKERS)),
  ) {
    this.seats = Array.from({ length: size }, () => this.seat());
  }

  surface(room: RoomJob): Promise<MapSurface> {
    return this.ask('surface', room, async (worker) => worker.load(room));
  }

  light(slot: string, room: RoomJob, lamp: LampJob): Promise<LampField> {
    return this.ask(`map ${slot}`, room, (worker) => worker.light(room.key, lamp));
  }

  gaps(room: RoomJob, lit: LitPlan, dose: Float32Array, target: number): Promise<GapsReport> {
    return this.ask('gaps', room, (worker) => worker.gaps(room.key, lit, dose, target));
  }

  close(): void {
    for (const job of this.waiting.values()) job.reject(new Superseded());
    this.waiting.clear();
    for (const seat of this.seats) {
      seat.job?.reject(new Superseded());
      seat.thread.terminate();
    }
  }

  private ask<T>(
    slot: string,
    room: RoomJob,
    work: (worker: Comlink.Remote<DoseWorker>) => Promise<T>,
  ): Promise<T> {
    return new Promise<T>((resolve, reject) => {
      this.waiting.get(slot)?.reject(new Superseded());
      this.waiting.delete(slot);
      this.waiting.set(slot, { slot, room, work, resolve: resolve as (answer: unknown) => void, reject });
      this.assign();
    });
  }

  private assign(): void {
    for (const [index, seat] of this.seats.entries()) {
      if (seat.job) continue;
      const busy = new Set(this.seats.map((other) => other.job?.slot));
      const job = [...this.waiting.values()].find((candidate) => !busy.has(candidate.slot));
      if (!job) return;
      this.waiting.delete(job.slot);
      seat.job = job;
      void this.run(seat, index, job);
    }
  }

  private async run(seat: Seat, index: number, job: Job): Promise<void> {
    try {
      if (seat.roomKey !== job.room.key) {
        await seat.remote.load(job.room);
        seat.roomKey = job.room.key;
      }
      job.resolve(await job.work(seat.remote));
    } catch (error) {
      job.reject(error instanceof Error ? error : new Error(String(error)));
    }
    // A seat that died in between was already replaced.
    if (this.seats[index] === seat) seat.job = null;
    this.assign();
  }

  private seat(): Seat {
    const thread = this.startThread();
    const seat: Seat = { thread, remote: Comlink.wrap<DoseWorker>(thread), roomKey: null, job: null };
    thread.onerror = (event) => {
      event.preventDefault();
      thread.terminate();
      seat.job?.reject(new Error(event.message || 'The dose calculation stopped unexpectedly.'));
      const index = this.seats.indexOf(seat);
      if (index >= 0) this.seats[index] = this.seat();
      this.assign();
    };
    return seat;
  }
}

export const startDoseThread = (): Worker =>
  new Worker(new URL('./dose.worker.ts', import.meta.url), { type: 'module' });
