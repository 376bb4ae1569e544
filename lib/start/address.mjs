import { createServer } from "node:net";
import { Refusal } from "./run.mjs";

/** Port and host to listen on: PORT (3000) and HOST (loopback). */
export const listenAddress = (env = process.env) => {
  const text = env.PORT ?? "3000";
  const port = /^\d{1,5}$/.test(text) ? Number(text) : Number.NaN;
  if (!(port >= 0 && port <= 65535)) {
    throw new Refusal(`PORT is "${text}"; it must be a whole number from 0 (any free one) to 65535.`);
  }
  return { port, host: env.HOST || "127.0.0.1" };
};

/** The one line for a listen that failed. */
export const listenRefusal = (error, { port, host }) => {
  if (error.code === "EADDRINUSE") {
    return new Refusal(`Port ${port} on ${host} is taken. End what uses it, or choose another with PORT=….`);
  }
  if (error.code === "EACCES") return new Refusal(`Port ${port} on ${host} may not be opened by this user.`);
  return new Refusal(`Cannot listen on ${host}, port ${port}: ${error.message}`);
};

/** Refuses at once when the port cannot be had, before minutes go into a build. */
export const assertPortFree = (address) =>
  new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once("error", (error) => reject(listenRefusal(error, address)));
    probe.listen({ ...address, exclusive: true }, () => probe.close(() => resolve(undefined)));
  });
