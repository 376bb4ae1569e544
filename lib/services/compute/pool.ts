import "server-only";
import { availableParallelism } from "node:os";
import { Worker } from "node:worker_threads";
import type { Drawing } from "@/lib/drawing/schema";
import { AppError } from "@/lib/errors";
import type { Computed, ComputeReply, ComputeRequest, ComputeTask } from "./messages";

export const COMPUTE_LIMIT_MS = 10_000;
/** More waiting than this and the server says it is busy instead of promising. */
const MAX_WAITING = 200;

type Task = Readonly<{
  asked: ComputeTask;
  limitMs: number;
  signal: AbortSignal | undefined;
  resolve: (value: ComputeReply["result"]) => void;
  reject: (error: Error) => void;
}>;
type Thread = { worker: Worker; task: Task | null; timer: NodeJS.Timeout | null; seq: number };

/** Safe: a thread answers a task by its kind. */
const answerOf = <K extends ComputeTask["kind"]>(result: ComputeReply["result"]): Computed<K> =>
  result as Computed<K>;

const stopped = () => new AppError("unreadable", { user: "The computation was stopped." });
const tooLong = (limitMs: number) =>
  new AppError("invalid", {
    user: `This drawing takes longer than ${limitMs / 1000} s to compute: simplify its outlines or split it.`,
    issues: [
      {
        code: "compute.tooLong",
        detail: "Takes too long to compute: simplify or split it.",
        pointer: "/drawing",
      },
    ],
  });

const startWorker = (): Worker =>
  process.env.NEXT_RUNTIME === "nodejs"
    ? new Worker(new URL("./worker.ts", import.meta.url))
    : new Worker(new URL("./worker-source.mjs", import.meta.url), {
        execArgv: ["--conditions=react-server"],
      });

/**
 * Threads that compute sections away from the event loop. A task that runs over its limit, or whose signal aborts, ends
 * its thread (nothing in there holds a file or a lock) and a new one takes its place.
 */
export class ComputePool {
  private readonly threads: Thread[] = [];
  private readonly waiting: Task[] = [];
  private closed = false;

  constructor(private readonly size: number) {}

  /** Starts the threads and computes one plate in each, so that the first person does not wait for it. */
  async warmUp(plate: Drawing): Promise<void> {
    await Promise.all(
      Array.from({ length: this.size }, () => this.run({ kind: "properties", drawing: plate })),
    );
  }

  run<T extends ComputeTask>(
    asked: T,
    options: Readonly<{ limitMs?: number; signal?: AbortSignal }> = {},
  ): Promise<Computed<T["kind"]>> {
    const { limitMs = COMPUTE_LIMIT_MS, signal } = options;
    if (this.closed || signal?.aborted) return Promise.reject(stopped());
    if (this.waiting.length >= MAX_WAITING) {
      return Promise.reject(
        new AppError("busy", {
          user: "Too much is being computed at once; try again in a moment.",
          retryAfterSeconds: 2,
        }),
      );
    }
    return new Promise<ComputeReply["result"]>((resolve, reject) => {
      const task: Task = { asked, limitMs, signal, resolve, reject };
      signal?.addEventListener("abort", () => this.abort(task), { once: true });
      this.waiting.push(task);
      this.next();
    }).then((result) => answerOf<T["kind"]>(result));
  }

  async close(): Promise<void> {
    this.closed = true;
    for (const task of this.waiting.splice(0)) task.reject(stopped());
    await Promise.all(
      this.threads.splice(0).map((thread) => {
        if (thread.timer) clearTimeout(thread.timer);
        thread.task?.reject(stopped());
        return thread.worker.terminate();
      }),
    );
  }

  private next(): void {
    while (this.waiting.length > 0) {
      const thread = this.threads.find((t) => t.task === null) ?? this.grow();
      const task = thread && this.waiting.shift();
      if (!thread || !task) return;
      thread.task = task;
      thread.seq += 1;
      thread.timer = setTimeout(() => this.end(thread, tooLong(task.limitMs)), task.limitMs);
      const request: ComputeRequest = { seq: thread.seq, task: task.asked };
      thread.worker.postMessage(request);
    }
  }

  private grow(): Thread | null {
    if (this.threads.length >= this.size) return null;
    const thread: Thread = { worker: startWorker(), task: null, timer: null, seq: 0 };
    thread.worker.unref();
    thread.worker.on("message", (reply: ComputeReply) => this.finish(thread, reply));
    thread.worker.on("error", (error) =>
      this.end(thread, error instanceof Error ? error : new Error(String(error))),
    );
    thread.worker.on("exit", () => this.end(thread, new Error("a compute thread ended")));
    this.threads.push(thread);
    return thread;
  }

  private finish(thread: Thread, reply: ComputeReply): void {
    if (reply.seq !== thread.seq || thread.task === null) return;
    if (thread.timer) clearTimeout(thread.timer);
    const { task } = thread;
    thread.task = null;
    task.resolve(reply.result);
    this.next();
  }

  /** Takes a thread out of service; whoever waited for it gets the error. */
  private end(thread: Thread, error: Error): void {
    const at = this.threads.indexOf(thread);
    if (at < 0) return;
    this.threads.splice(at, 1);
    if (thread.timer) clearTimeout(thread.timer);
    thread.task?.reject(error);
    thread.task = null;
    void thread.worker.terminate();
    if (!this.closed) this.next();
  }

  private abort(task: Task): void {
    const waitingAt = this.waiting.indexOf(task);
    if (waitingAt >= 0) {
      this.waiting.splice(waitingAt, 1);
      task.reject(stopped());
      return;
    }
    const thread = this.threads.find((t) => t.task === task);
    if (thread) this.end(thread, stopped());
  }
}

const store = globalThis as typeof globalThis & { flitchbookCompute?: ComputePool };

/** The pool of this process: one thread fewer than processors, two at least. */
export const computePool = (): ComputePool =>
  (store.flitchbookCompute ??= new ComputePool(Math.max(2, availableParallelism() - 1)));

export const closeComputePool = async (): Promise<void> => {
  const pool = store.flitchbookCompute;
  delete store.flitchbookCompute;
  await pool?.close();
};
