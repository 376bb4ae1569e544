// What `npm start`, `npm test` and `npm run dev` do before the program: install, build, migrate and seed as needed.
import { existsSync } from "node:fs";
import { join } from "node:path";
import { assertPortFree, listenAddress } from "./address.mjs";
import { build } from "./build.mjs";
import { install } from "./install.mjs";
import { main, Refusal, ROOT, run } from "./run.mjs";
import { assertWritable } from "./writable.mjs";

const STEPS = {
  start: ["port", "install", "build", "database"],
  dev: ["install", "database"],
  test: ["install", "build"],
  packages: ["install"],
};

const oldestNode = [20, 19];

const assertNode = () => {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major < oldestNode[0] || (major === oldestNode[0] && minor < oldestNode[1])) {
    throw new Refusal(`Node ${oldestNode.join(".")} or later is needed; this is ${process.versions.node}.`);
  }
};

const database = async () => {
  const script = join(ROOT, "lib", "commands", "prepare-database.ts");
  if (!existsSync(script)) return;
  const args = ["--conditions=react-server", "--import", "tsx", script];
  const done = await run(process.execPath, args);
  if (done.code !== 0) throw new Refusal(done.output.trim());
};

const DO = {
  port: () => assertPortFree(listenAddress()),
  install,
  build,
  database,
};

main(async () => {
  const steps = STEPS[process.argv[2]];
  if (steps === undefined) throw new Refusal(`prepare: say one of ${Object.keys(STEPS).join(", ")}.`);
  assertNode();
  assertWritable(ROOT);
  for (const step of steps) await DO[step]();
});
