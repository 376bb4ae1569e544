/** Success or failure as a value. Bad drawings and bad rows are values; exceptions are for bugs and for verbs that refuse. */
export type Ok<T> = Readonly<{ ok: true; value: T }>;
export type Err<E> = Readonly<{ ok: false; error: E }>;
export type Result<T, E = Fault> = Ok<T> | Err<E>;

/**
 * What is wrong with an input, in words a person can act on.
 * `code` is stable and dotted ("ring.selfCrossing"); `detail` is one sentence that says what to do;
 * `part` is the id of the part concerned; `pointer` is a JSON pointer into the document it came from.
 */
export type Fault = Readonly<{ code: string; detail: string; part?: string; pointer?: string }>;

export const ok = <T>(value: T): Ok<T> => ({ ok: true, value });
export const err = <E>(error: E): Err<E> => ({ ok: false, error });
