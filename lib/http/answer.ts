import "server-only";
import { etagOf } from "./version";

type Options = Readonly<{
  status?: number;
  /** Version of the record answered; becomes its ETag. */
  version?: number;
  headers?: Readonly<Record<string, string | readonly string[]>>;
}>;

const headersOf = ({ version, headers = {} }: Options): Headers => {
  const made = new Headers();
  for (const [name, value] of Object.entries(headers)) {
    for (const one of Array.isArray(value) ? value : [value]) made.append(name, String(one));
  }
  if (version !== undefined) made.set("etag", etagOf(version));
  return made;
};

/** A JSON answer; the wrapper adds the request id and no-store. */
export const json = (value: unknown, options: Options = {}): Response => {
  const headers = headersOf(options);
  headers.set("content-type", "application/json; charset=utf-8");
  return new Response(JSON.stringify(value), { status: options.status ?? 200, headers });
};

export const noContent = (options: Options = {}): Response =>
  new Response(null, { status: options.status ?? 204, headers: headersOf(options) });
