import { AppError } from "@/lib/errors";
import { isBusy, isFull } from "./retry";

export const WRITE_LIMIT_MS = 15_000;
const FIRST_WAIT_MS = 10;
const LONGEST_WAIT_MS = 250;

type Options = Readonly<{
  /** Throws the connection away; called after every BUSY before anything else is tried. */
  reconnect: () => Promise<void>;
  limitMs?: number;
  sleep?: (ms: number) => Promise<void>;
  now?: () => number;
}>;

type Slot = Readonly<{ label: string; since: number }>;

const pause = (ms: number) => new Promise<void>((resolve) => setTimeout(resolve, ms));

/**
 * One writer at a time in this process, in order of arrival. A task that meets a lock held from outside is tried again
 * on a new connection until `limitMs` from its arrival are over, then answers 503. After a BUSY a connection is never
 * used again: its writes can look done and be lost.
 */
export class WriteQueue {
  private tail: Promise<unknown> = Promise.resolve();
  private holder: Slot | null = null;
  private waiting = 0;
  private readonly limitMs: number;
  private readonly sleep: (ms: number) => Promise<void>;
  private readonly now: () => number;

  constructor(private readonly options: Options) {
    this.limitMs = options.limitMs ?? WRITE_LIMIT_MS;
    this.sleep = options.sleep ?? pause;
    this.now = options.now ?? Date.now;
  }

  /** What holds the slot now, for those who wait. */
  get heldBy(): string | null {
    return this.holder?.label ?? null;
  }

  get length(): number {
    return this.waiting;
  }

  /** Runs `task` when its turn comes; `task` must be a whole transaction, since it may run again after a BUSY. */
  run<T>(label: string, task: () => Promise<T>): Promise<T> {
    const arrived = this.now();
    const before = this.tail;
    this.waiting += 1;
    let left = false;
    const leave = () => {
      if (!left) this.waiting -= 1;
      left = true;
    };
    const turn = new Promise<T>((resolve, reject) => {
      const timer = setTimeout(() => {
        leave();
        reject(this.busy());
      }, this.limitMs);
      const start = async () => {
        clearTimeout(timer);
        if (left) return;
        leave();
        this.holder = { label, since: this.now() };
        try {
          resolve(await this.attempt(arrived, task));
        } catch (error) {
          reject(error instanceof Error ? error : new Error("write failed", { cause: error }));
        } finally {
          this.holder = null;
        }
      };
      this.tail = before.then(start, start);
    });
    return turn;
  }

  private async attempt<T>(arrived: number, task: () => Promise<T>): Promise<T> {
    for (let wait = FIRST_WAIT_MS; ; wait = Math.min(wait * 2, LONGEST_WAIT_MS)) {
      try {
        return await task();
      } catch (error) {
        if (isFull(error)) {
          throw new AppError("full", {
            user: "The server's disk is full; nothing was saved. Ask whoever runs the server to make room.",
            cause: error,
          });
        }
        if (!isBusy(error)) throw error;
        await this.options.reconnect();
        if (this.now() - arrived + wait > this.limitMs) throw this.busy(error);
        await this.sleep(wait);
      }
    }
  }

  private busy(cause?: unknown): AppError {
    const held = this.holder && this.holder.label !== "" ? ` (${this.holder.label})` : "";
    return new AppError("busy", {
      user: `The library is being written to${held}; nothing of yours was saved. Try again in a moment.`,
      retryAfterSeconds: 5,
      cause,
    });
  }
}
