import "server-only";
import { AppError } from "@/lib/errors";
import type { Unparsed } from "@/lib/services/context";

/** Largest JSON body: a drawing of 20,000 vertices needs about 1.5 MB. */
export const MAX_JSON_BYTES = 4 * 1024 * 1024;

const tooLarge = (limit: number) =>
  new AppError("tooLarge", { user: `The request is larger than ${Math.floor(limit / 1024)} kB.` });

/** Reads a body up to a limit; one cut short of its announced length is refused. */
export const readBytes = async (request: Request, limit: number): Promise<Uint8Array> => {
  const announced = Number(request.headers.get("content-length") ?? Number.NaN);
  if (announced > limit) throw tooLarge(limit);
  const chunks: Uint8Array[] = [];
  let size = 0;
  if (request.body) {
    for await (const chunk of request.body as ReadableStream<Uint8Array> & AsyncIterable<Uint8Array>) {
      size += chunk.byteLength;
      if (size > limit) throw tooLarge(limit);
      chunks.push(chunk);
    }
  }
  if (Number.isFinite(announced) && size !== announced) {
    throw new AppError("unreadable", { user: "The request arrived cut short; send it again." });
  }
  return Buffer.concat(chunks);
};

/** "__proto__" as a key would set a prototype in careless code; no document of ours has it. */
const refuseProto = (key: string, value: unknown): unknown => {
  if (key === "__proto__") throw new SyntaxError("__proto__");
  return value;
};

/** The JSON of a body: application/json only, UTF-8 only, broken JSON is 400. The cast is safe: an Unparsed value can only be parsed. */
export const readJson = async (request: Request): Promise<Unparsed> => {
  const type = request.headers.get("content-type") ?? "";
  if (!/^application\/json\s*(;\s*charset\s*=\s*"?utf-8"?\s*)?$/i.test(type)) {
    throw new AppError("wrongType", { user: "Send application/json." });
  }
  const bytes = await readBytes(request, MAX_JSON_BYTES);
  try {
    return JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes), refuseProto) as Unparsed;
  } catch (cause) {
    throw new AppError("unreadable", { user: "The body is not valid JSON in UTF-8.", cause });
  }
};
