import { checkIntegrity, migrateDatabase, refuseNewer } from "@/db/migrate";
import { runCommand } from "./command";

// Before the server starts: whole, ours, migrated.
void runCommand(async (db) => {
  await checkIntegrity(db.writer);
  await refuseNewer(db.writer);
  await migrateDatabase(db.writer);
});
