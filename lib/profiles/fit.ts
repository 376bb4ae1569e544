import { err, type Err, type Fault } from "@/lib/result";

/** A dimension that does not go with the others; `field` is its key, `detail` says in one sentence what to do. */
export const misfit = (field: string, detail: string): Err<Fault> =>
  err({ code: "profile.doesNotFit", detail, pointer: `/dimensions/${field}` });
