import "server-only";

type Given<T> = { [K in keyof T]?: Exclude<T[K], undefined> };

/** The fields that were sent, without the ones left out. */
export const given = <T extends object>(input: T): Given<T> =>
  Object.fromEntries(Object.entries(input).filter(([, value]) => value !== undefined)) as Given<T>;
