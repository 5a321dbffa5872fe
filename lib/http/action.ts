import "server-only";
import { randomUUID } from "node:crypto";
import { headers } from "next/headers";
import { unstable_rethrow } from "next/navigation";
import type { z } from "zod";
import { addressOf } from "@/lib/auth/address";
import { getActor } from "@/lib/auth/get-actor";
import { type AllowanceName, limitRate } from "@/lib/auth/rate-limit";
import { now } from "@/lib/config/clock";
import { log } from "@/lib/config/log";
import { formValues } from "@/lib/http/form-values";
import { parseOrRefuse } from "@/lib/http/parse";
import type { FormAction } from "@/lib/shared/action-state";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

interface ActionInput<T> {
  actor: Actor;
  now: Date;
  requestId: string;
  input: T;
}

interface ActionOptions {
  /** Signed-in people only (the default). */
  signedIn?: boolean;
  limit?: AllowanceName;
}

/**
 * The one way to build a server action: actor, rate limit, zod, one command, a state the form can show.
 * The argument is a FormData (dotted names become nested objects) or the object a client sent.
 */
export function action<S extends z.ZodType, R>(
  schema: S,
  handle: (input: ActionInput<z.output<S>>) => Promise<R>,
  { signedIn = true, limit = "write-person" }: ActionOptions = {},
): FormAction<R> {
  return async (_before, sent) => {
    const requestId = randomUUID();
    const values = sent instanceof FormData ? formValues(sent) : sent;
    try {
      const actor = await getActor();
      if (signedIn && actor.kind === "visitor")
        throw new AppError("not_signed_in", "Sign in first. What you typed is kept.");
      await limitRate(limit, actor.kind === "person" ? actor.userId : addressOf(await headers()));
      const input = parseOrRefuse(schema, values);
      return { state: "done", result: await handle({ actor, now: now(), requestId, input }) };
    } catch (error) {
      unstable_rethrow(error);
      if (error instanceof AppError) {
        const { code, message, problems, current } = error;
        return { state: "refused", code, message, problems, values, ...(current ? { current } : {}) };
      }
      log().error({ err: error, requestId }, "unexpected error in an action");
      const message = `Something went wrong here and nothing was saved. Quote ${requestId} when you report it.`;
      return { state: "refused", code: "unexpected", message, problems: [], values };
    }
  };
}
