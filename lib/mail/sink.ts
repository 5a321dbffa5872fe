import "server-only";
import { type ParsedMail, simpleParser } from "mailparser";
import { SMTPServer } from "smtp-server";

export interface CaughtMail {
  fromAddress: string;
  toAddress: string;
  subject: string;
  body: string;
}

declare global {
  // On the global object because a server bundle may hold this module more than once.
  var byssusSinkPort: number | undefined;
}

/** Largest mail the sink takes, bytes. */
const MAX_BYTES = 2_000_000;

/** The port the sink of this process listens on; null: it does not run. */
export function sinkPort(): number | null {
  return globalThis.byssusSinkPort ?? null;
}

/**
 * Starts an SMTP server on the loopback address that delivers nothing and hands every mail to `keep`.
 * Takes any free port when the wanted one is busy, so that two running copies never catch each other's mail.
 */
export async function startSink(
  wantedPort: number,
  keep: (mail: CaughtMail) => Promise<void>,
): Promise<{ port: number; stop: () => Promise<void> }> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["AUTH", "STARTTLS"],
    size: MAX_BYTES,
    onData: (stream, _session, done) => {
      simpleParser(stream)
        .then((mail) => keep(caught(mail)))
        .then(
          () => done(),
          (error: unknown) => done(error instanceof Error ? error : new Error(String(error))),
        );
    },
  });
  const port = await listen(server, wantedPort).catch((error: unknown) => {
    if (error instanceof Error && "code" in error && error.code === "EADDRINUSE") return listen(server, 0);
    throw error;
  });
  server.on("error", () => undefined);
  globalThis.byssusSinkPort = port;
  return {
    port,
    stop: () =>
      new Promise((resolve) => {
        globalThis.byssusSinkPort = undefined;
        server.close(resolve);
      }),
  };
}

function listen(server: SMTPServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, "127.0.0.1", () => {
      server.off("error", reject);
      const address = server.server.address();
      resolve(typeof address === "object" && address ? address.port : port);
    });
  });
}

function caught(mail: ParsedMail): CaughtMail {
  const to = Array.isArray(mail.to) ? mail.to[0] : mail.to;
  return {
    fromAddress: mail.from?.text ?? "",
    toAddress: to?.value[0]?.address ?? "",
    subject: mail.subject ?? "",
    body: mail.text ?? "",
  };
}
