import { expect } from "vitest";
import { DEMO_PASSWORD, type DemoAccount } from "@/tests/helpers/demo-accounts";

type Send = Readonly<{
  body?: unknown;
  /** Bytes sent as they are, instead of JSON. */
  raw?: Readonly<{ bytes: Uint8Array<ArrayBuffer>; type: string }>;
  ifMatch?: string | number | null;
  headers?: Record<string, string>;
}>;

export type Answer<T> = Readonly<{ status: number; body: T; headers: Headers; etag: string }>;

export type Client = Readonly<{
  send: <T = Record<string, unknown>>(method: string, path: string, send?: Send) => Promise<Answer<T>>;
  get: <T>(path: string) => Promise<Answer<T>>;
}>;

/** A program that speaks /api/v1 with the cookie of a session, from the server's own origin. */
export const clientOf = (url: string, cookie = ""): Client => {
  const send: Client["send"] = async (method, path, { body, raw, ifMatch, headers = {} } = {}) => {
    const sent = new Headers({ origin: url, ...(cookie && { cookie }), ...headers });
    if (body !== undefined) sent.set("content-type", "application/json");
    if (raw) sent.set("content-type", raw.type);
    if (ifMatch !== undefined && ifMatch !== null)
      sent.set("if-match", typeof ifMatch === "number" ? `"${ifMatch}"` : ifMatch);
    const payload = raw ? raw.bytes : body === undefined ? null : JSON.stringify(body);
    const answer = await fetch(`${url}/api/v1${path}`, {
      method,
      headers: sent,
      body: payload,
      redirect: "manual",
    });
    const text = await answer.text();
    const json = answer.headers.get("content-type")?.includes("json") ?? false;
    return {
      status: answer.status,
      body: json ? JSON.parse(text) : text,
      headers: answer.headers,
      etag: answer.headers.get("etag") ?? "",
    };
  };
  return { send, get: (path) => send("GET", path) };
};

/** Signs a demo account in and answers its client. */
export const signedIn = async (url: string, account: DemoAccount): Promise<Client> => {
  const answer = await clientOf(url).send("POST", "/session", {
    body: { email: `${account}@harrowtide.example`, password: DEMO_PASSWORD },
  });
  expect(answer.status, JSON.stringify(answer.body)).toBe(201);
  const cookie = answer.headers
    .getSetCookie()
    .map((line) => line.split(";")[0])
    .join("; ");
  return clientOf(url, cookie);
};

/** Fails unless the answer has the status; the body is shown when it has not. */
export const expectStatus = <T>(answer: Answer<T>, status: number): Answer<T> => {
  expect(answer.status, JSON.stringify(answer.body)).toBe(status);
  return answer;
};
