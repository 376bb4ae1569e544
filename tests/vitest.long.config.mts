import { defineConfig } from "vitest/config";
import { inTurn, resolve, root } from "./vitest.shared.mts";

export default defineConfig({
  root,
  resolve,
  test: { projects: [inTurn("long", ["long"], 0)], testTimeout: 600_000, hookTimeout: 600_000 },
});
