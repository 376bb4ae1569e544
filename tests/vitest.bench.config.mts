import { defineConfig } from "vitest/config";
import { inTurn, resolve, root } from "./vitest.shared.mts";

export default defineConfig({
  root,
  resolve,
  test: { projects: [inTurn("bench", ["performance"], 0)] },
});
