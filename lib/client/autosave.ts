import { AppError } from '@/lib/errors';

export type SaveState = 'saved' | 'unsaved' | 'saving' | 'conflict' | 'offline' | 'error';

export interface SaveStanding {
  readonly state: SaveState;
  readonly savedAt: Date | null;
  /** Words for the person when `state` is `conflict` or `error`. */
  readonly message: string | null;
  /** What the server said of the version that won, when `state` is `conflict`. */
  readonly winner: Readonly<Record<string, unknown>> | null;
}

/**
 * Writes a value over version `etag` and answers the new version.
 * Throws AppError for a refusal and anything else for a broken line.
 */
export type Save<T> = (value: T, etag: string) => Promise<{ etag: string }>;

/** What the server holds when an answer was lost: nobody here can say. */
const UNKNOWN = Symbol('unknown');

const underWay = new Set<Promise<unknown>>();

/** Resolves when every save that is under way has been answered: what is loaded after it is not older. */
export async function savesAnswered(): Promise<void> {
  await Promise.allSettled(underWay);
}

/**
 * Keeps one value saved: waits for a pause in editing, sends one request at a time and always the newest
 * value. A refusal stops and says so; a broken line is tried again until it holds, first with the very value
 * whose answer was lost: the server may have it already, and knows a repeated save. Nothing is dropped: the
 * value stays with the caller whatever the answer. Values are compared by identity: replace, never mutate.
 */
export class Autosaver<T> {
  private current: T;
  private saved: T | typeof UNKNOWN;
  private standing: SaveStanding = { state: 'saved', savedAt: null, message: null, winner: null };
  /** Was sent, and the line broke before the answer: sent again before anything else. */
  private inDoubt: { readonly value: T } | null = null;
  private running: Promise<boolean> | null = null;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private readonly listeners = new Set<() => void>();

  constructor(
    value: T,
    private etag: string,
    private readonly save: Save<T>,
    private readonly pauseMs = 700,
    private readonly retryMs = 5000,
  ) {
    this.current = value;
    this.saved = value;
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly getStanding = (): SaveStanding => this.standing;

  get hasUnsaved(): boolean {
    return this.current !== this.saved;
  }

  /** Takes the newest value and saves it after a pause. In a conflict it only keeps it: the person decides. */
  set(value: T): void {
    if (value === this.current) return;
    this.current = value;
    if (this.standing.state === 'conflict') return;
    if (!this.running) this.say({ state: 'unsaved' });
    this.later(this.pauseMs);
  }

  /** Saves now; over the version in `over` when the person chose to replace it. True when all is saved. */
  saveNow(over?: { etag: string }): Promise<boolean> {
    if (over) this.etag = over.etag;
    clearTimeout(this.timer);
    if (this.running) return this.running;
    const running = this.run().finally(() => {
      this.running = null;
      underWay.delete(running);
    });
    this.running = running;
    underWay.add(running);
    return running;
  }

  /** Takes `value` at version `etag` as what is saved, after the person chose the other version. */
  accept(value: T, etag: string): void {
    this.current = value;
    this.saved = value;
    this.etag = etag;
    this.inDoubt = null;
    this.say({ state: 'saved', message: null, winner: null });
  }

  private async run(): Promise<boolean> {
    while (this.hasUnsaved) {
      const sending = this.inDoubt ? this.inDoubt.value : this.current;
      this.say({ state: 'saving' });
      try {
        this.etag = (await this.save(sending, this.etag)).etag;
        this.saved = sending;
        this.inDoubt = null;
      } catch (error) {
        const refused = error instanceof AppError;
        this.inDoubt = refused ? null : { value: sending };
        if (!refused) this.saved = UNKNOWN;
        this.refuse(error);
        // What was refused is not what is on the desk any more: that is for the server to judge.
        if (this.standing.state === 'error' && sending !== this.current) continue;
        return false;
      }
    }
    this.say({ state: 'saved', savedAt: new Date(), message: null, winner: null });
    return true;
  }

  private refuse(error: unknown): void {
    if (!(error instanceof AppError)) {
      this.say({ state: 'offline' });
      this.later(this.retryMs);
    } else if (error.code === 'stale') {
      clearTimeout(this.timer);
      this.say({ state: 'conflict', message: error.message, winner: error.extra });
    } else {
      this.say({ state: 'error', message: error.message });
    }
  }

  private later(ms: number): void {
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.saveNow(), ms);
  }

  private say(change: Partial<SaveStanding>): void {
    this.standing = { ...this.standing, ...change };
    for (const listener of this.listeners) listener();
  }
}
