import "server-only";

/** Raised when the engine's numbers change, so that `npm run recompute` can say which released figures would. */
export const ENGINE_VERSION = "2";
