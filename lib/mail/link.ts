import "server-only";
import { environment } from "@/lib/env";

/** Address of a page for a letter. The host comes from the configuration, never from a request. */
export const linkTo = (path: string): string => {
  const { PUBLIC_ORIGIN, HOST, PORT } = environment();
  const host = HOST.includes(":") ? `[${HOST}]` : HOST;
  return new URL(path, PUBLIC_ORIGIN ?? `http://${host}:${PORT}`).href;
};
