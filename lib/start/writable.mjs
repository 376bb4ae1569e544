import { mkdirSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { Refusal } from "./run.mjs";

/** Refuses a folder in which no file can be made, naming it and the reason. */
export const assertWritable = (folder) => {
  const probe = join(folder, `.writable-${process.pid}`);
  try {
    mkdirSync(folder, { recursive: true });
    writeFileSync(probe, "");
    rmSync(probe);
  } catch (error) {
    throw new Refusal(`The folder ${folder} cannot be written (${error.code}). Give this user write access.`);
  }
};
