// Starts the job thread from its TypeScript source, for commands and tests; the built server has its own bundle.
import { createRequire } from "node:module";
import { register } from "tsx/cjs/api";

register();
createRequire(import.meta.url)("./job-worker.ts");
