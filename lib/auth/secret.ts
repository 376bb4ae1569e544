import "server-only";
import { createHash, randomBytes } from "node:crypto";

/** 256 random bits for a cookie, a link or a token, safe in URLs. */
export const newSecret = (): string => randomBytes(32).toString("base64url");

/** What of a secret is stored: its SHA-256, hex. The secret itself has enough bits to need no salt. */
export const hashSecret = (secret: string): string => createHash("sha256").update(secret).digest("hex");
