import { fileURLToPath } from "node:url";

export const root = fileURLToPath(new URL("..", import.meta.url));

/** The alias of the compiler, and `server-only` as an empty file: it throws outside a server bundle. */
export const resolve = {
  alias: [
    { find: /^@\//, replacement: root },
    { find: /^server-only$/, replacement: `${root}tests/helpers/empty.ts` },
  ],
};

const common = {
  environment: "node" as const,
  pool: "forks" as const,
  passWithNoTests: false,
  env: { LOG_LEVEL: "silent" },
  setupFiles: [`${root}tests/helpers/random-seed.ts`],
};

/** Suites that share nothing: as many at once as there are cores. */
export const apart = (name: string, folders: readonly string[]) => ({
  extends: true as const,
  test: {
    ...common,
    name,
    include: folders.map((folder) => `tests/${folder}/**/*.test.{ts,tsx}`),
    testTimeout: 60_000,
    hookTimeout: 120_000,
    sequence: { groupOrder: 0 },
  },
});

/** Suites that each run a server of their own: one after the other, after all others. */
export const inTurn = (name: string, folders: readonly string[], groupOrder: number) => ({
  extends: true as const,
  test: {
    ...common,
    name,
    include: folders.map((folder) => `tests/${folder}/**/*.test.{ts,tsx}`),
    fileParallelism: false,
    maxWorkers: 1,
    testTimeout: 90_000,
    hookTimeout: 180_000,
    sequence: { groupOrder },
  },
});
