import "server-only";
import { v7 as uuidv7 } from "uuid";

/** A new UUIDv7: ids sort by their time of birth. */
export const newId = (): string => uuidv7();
