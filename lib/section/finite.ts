/** Whether every number inside a plain value (objects and arrays, to any depth) is finite. */
export const everyNumberIsFinite = (value: unknown): boolean => {
  if (typeof value === "number") return Number.isFinite(value);
  if (value === null || typeof value !== "object") return true;
  return Object.values(value).every(everyNumberIsFinite);
};
