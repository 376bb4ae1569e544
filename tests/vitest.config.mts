import { defineConfig } from "vitest/config";
import { apart, inTurn, resolve, root } from "./vitest.shared.mts";

export default defineConfig({
  root,
  resolve,
  test: {
    coverage: { provider: "v8", include: ["lib/**/*.ts", "db/**/*.ts"], reportsDirectory: "coverage" },
    projects: [
      apart("fast", ["structure", "unit", "property", "reference"]),
      apart("services", ["services"]),
      inTurn("api", ["api"], 1),
      inTurn("browser", ["browser"], 2),
    ],
  },
});
