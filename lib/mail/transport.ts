import "server-only";
import { createTransport, type Transporter } from "nodemailer";
import { environment } from "@/lib/env";
import { fakeMailServer } from "./fake-server";

/** Nothing here waits long: a mail server that does not answer is tried again later. */
const TIME_OUTS = {
  connectionTimeout: 5_000,
  greetingTimeout: 5_000,
  socketTimeout: 10_000,
  dnsTimeout: 5_000,
};

/** nodemailer over SMTP_URL; without it to the fake on loopback. */
export const mailTransport = async (): Promise<Transporter> => {
  const { SMTP_URL } = environment();
  if (SMTP_URL !== undefined) return createTransport({ url: SMTP_URL, ...TIME_OUTS });
  const { port } = await fakeMailServer();
  return createTransport({ host: "127.0.0.1", port, secure: false, ignoreTLS: true, ...TIME_OUTS });
};
