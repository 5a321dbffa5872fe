import "server-only";
import { getDb } from "@/db/client";
import { insertSinkMail } from "@/db/repositories/sink-mails";
import { drainOutbox } from "@/lib/commands/drain-outbox";
import { sweep } from "@/lib/commands/sweep";
import { now } from "@/lib/config/clock";
import { env, usesMailSink } from "@/lib/config/env";
import { log } from "@/lib/config/log";
import { startSink } from "@/lib/mail/sink";
import { openTransport } from "@/lib/mail/transport";

const DRAIN_EVERY_MS = 15_000;
const SWEEP_EVERY_MS = 3_600_000;

declare global {
  // On the global object because pages, routes and instrumentation may each hold a copy of this module.
  var byssusMailLoop: { wake: () => void } | undefined;
}

/** Starts what runs beside the requests: the sink where it is used, the mail drain, the hourly sweep. */
export async function startMailLoop(): Promise<void> {
  if (globalThis.byssusMailLoop) return;
  let running = false;
  let again = false;
  const drain = async () => {
    again = true;
    if (running) return;
    running = true;
    try {
      while (again) {
        again = false;
        await drainOnce();
      }
    } finally {
      running = false;
    }
  };
  const wake = () => void drain().catch(complain("mail drain"));
  globalThis.byssusMailLoop = { wake };

  if (usesMailSink()) {
    const sink = await startSink(env().BYSSUS_SINK_PORT, (mail) =>
      insertSinkMail(getDb(), { ...mail, receivedAt: now() }),
    );
    log().info({ port: sink.port }, "mail is caught by the local sink; read it at /mailbox");
  } else if (!env().SMTP_URL) {
    log().warn("SMTP_URL is not set: mail waits in the outbox until it is");
  }
  setInterval(wake, DRAIN_EVERY_MS).unref();
  setInterval(() => void sweep(getDb(), now()).catch(complain("sweep")), SWEEP_EVERY_MS).unref();
  wake();
}

/** Called after a commit that queued mail, so it leaves at once. Nothing depends on it. */
export function nudgeMail(): void {
  globalThis.byssusMailLoop?.wake();
}

async function drainOnce(): Promise<void> {
  const deliver = openTransport();
  if (!deliver) return;
  const { sent, failed } = await drainOutbox(getDb(), deliver, now);
  if (failed > 0) log().warn({ sent, failed }, "some mail could not be sent yet");
}

function complain(what: string) {
  return (error: unknown) => log().error({ err: error }, `${what} failed; it is tried again`);
}
