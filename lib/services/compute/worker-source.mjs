// Starts the compute thread from its TypeScript source, for commands and tests; the built server has its own bundle.
import { tsImport } from "tsx/esm/api";

await tsImport("./worker.ts", import.meta.url);
