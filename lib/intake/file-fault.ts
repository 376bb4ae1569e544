import type { Fault } from "@/lib/result";

/** Why a whole file cannot be read, with its place: `line` and `column` count from 1, `byte` from 0. */
export type FileFault = Fault &
  Readonly<{
    line?: number;
    column?: number;
    byte?: number;
    /** Lines as another encoding would read them, for a person to confirm. */
    samples?: readonly string[];
  }>;
