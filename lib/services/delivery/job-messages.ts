/** Between the process and the thread that does a job. */
export type JobStart = Readonly<{ jobId: string; url: string; authToken: string | null }>;
/** The slot of the write queue is yours. */
export type JobRequest = "go";
export type JobReply =
  | Readonly<{ kind: "slot"; label: string }>
  | Readonly<{ kind: "free" }>
  | Readonly<{ kind: "done" }>
  | Readonly<{ kind: "failed"; message: string }>;
