import type { ErrorCode, FieldProblem } from "@/lib/shared/errors";

/** What a form gets back from its action. On a refusal `values` holds what was typed, so nothing is lost. */
export type ActionState<R> =
  | { state: "idle" }
  | { state: "done"; result: R }
  | {
      state: "refused";
      code: ErrorCode | "unexpected";
      message: string;
      problems: readonly FieldProblem[];
      values: unknown;
      /** The stored version when a stale save was refused. */
      current?: Record<string, unknown>;
    };

/** A server action as a form is given it: the last state and what is sent, to the next state. */
export type FormAction<R> = (before: ActionState<R>, sent: unknown) => Promise<ActionState<R>>;
