// The server process itself: one process, one line, ended by SIGTERM or Ctrl-C within 8 seconds.
import { createServer } from "node:http";
import next from "next";
import { listenAddress, listenRefusal } from "./address.mjs";
import { main, ROOT } from "./run.mjs";

/** Time in which open requests may finish; the whole ending takes at most 8 s. */
const FINISH_MS = 6_000;

const stopOn = (server) => {
  let ending = false;
  const end = () => {
    if (ending) return;
    ending = true;
    setTimeout(() => server.closeAllConnections(), FINISH_MS).unref();
    setTimeout(() => process.exit(1), FINISH_MS + 1_500).unref();
    server.close(async () => {
      // db/client.ts keeps the database of the process there, whichever bundle opened it.
      await (await globalThis.flitchbookDb)?.close();
      process.exit(0);
    });
    server.closeIdleConnections();
  };
  process.on("SIGTERM", end).on("SIGINT", end);
};

/** Next tells on stdout how long its configuration took; stdout is for the address. */
const prepared = async (app) => {
  const { log } = console;
  console.log = () => undefined;
  await app.prepare();
  console.log = log;
};

main(async () => {
  process.env.NODE_ENV = "production";
  // Next would end the process by itself on a signal, before open requests are finished.
  process.env.NEXT_MANUAL_SIG_HANDLE = "true";
  const address = listenAddress();
  const server = createServer();
  stopOn(server);
  await new Promise((resolve, reject) => {
    server.once("error", (error) => reject(listenRefusal(error, address)));
    server.listen(address, resolve);
  });
  const { port } = server.address();
  const app = next({ dev: false, dir: ROOT, hostname: address.host, port });
  const handler = prepared(app).then(() => app.getRequestHandler());
  server.on("request", async (request, response) => {
    // Who is at the other end of the socket; a header of that name from outside is overwritten.
    request.headers["x-peer-address"] = request.socket.remoteAddress ?? "unknown";
    await (
      await handler
    )(request, response);
  });
  await handler;
  const shown = address.host.includes(":") ? `[${address.host}]` : address.host;
  process.stdout.write(`Flitchbook is at http://${shown}:${port}\n`);
});
