import "server-only";
import type { AddressInfo } from "node:net";
import PostalMime from "postal-mime";
import { SMTPServer } from "smtp-server";

export type CaughtLetter = Readonly<{ to: string; subject: string; text: string; at: number }>;

const MOST_LETTERS = 200;
const MAX_BYTES = 1024 * 1024;

/** A mail server of this process's own, on loopback: it takes every letter and sends none. Its mailbox is the demo's. */
export class FakeMailServer {
  readonly letters: CaughtLetter[] = [];

  private constructor(
    private readonly server: SMTPServer,
    readonly port: number,
  ) {}

  static async start(): Promise<FakeMailServer> {
    const caught: { take: (raw: Buffer, to: string) => Promise<void> } = { take: async () => undefined };
    const server = new SMTPServer({
      authOptional: true,
      disabledCommands: ["AUTH", "STARTTLS"],
      size: MAX_BYTES,
      onData(stream, session, done) {
        const chunks: Buffer[] = [];
        stream.on("data", (chunk: Buffer) => chunks.push(chunk));
        stream.on("end", () => {
          const to = session.envelope.rcptTo.map((recipient) => recipient.address).join(", ");
          caught.take(Buffer.concat(chunks), to).then(() => done(), done);
        });
      },
    });
    await new Promise<void>((resolve, reject) => {
      server.on("error", reject);
      server.listen(0, "127.0.0.1", resolve);
    });
    // Safe: a server that listens on a host and port has an AddressInfo.
    const { port } = server.server.address() as AddressInfo;
    server.server.unref();
    const fake = new FakeMailServer(server, port);
    caught.take = (raw, to) => fake.take(raw, to);
    return fake;
  }

  close(): Promise<void> {
    return new Promise((resolve) => this.server.close(() => resolve()));
  }

  private async take(raw: Buffer, to: string): Promise<void> {
    const { subject = "", text = "" } = await PostalMime.parse(raw);
    this.letters.unshift({ to, subject, text: text.trim(), at: Date.now() });
    this.letters.length = Math.min(this.letters.length, MOST_LETTERS);
  }
}

const store = globalThis as typeof globalThis & { flitchbookMail?: Promise<FakeMailServer> };

/** The fake of this process, started at first use. */
export const fakeMailServer = (): Promise<FakeMailServer> =>
  (store.flitchbookMail ??= FakeMailServer.start());

/** What the fake has caught; empty when letters go out to a real server. */
export const caughtLetters = async (): Promise<readonly CaughtLetter[]> =>
  store.flitchbookMail ? (await store.flitchbookMail).letters : [];
