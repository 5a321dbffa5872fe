"use client";

import { type FormEvent, startTransition, useActionState } from "react";
import type { FieldMessage } from "@/components/ui/error-summary";
import type { ActionState, FormAction } from "@/lib/shared/action-state";

export interface Form<R> {
  state: ActionState<R>;
  pending: boolean;
  /** Everything wrong with what was sent, for the summary at the top. */
  problems: readonly FieldMessage[];
  /** What is wrong with one field. */
  errorOf: (path: string) => string | undefined;
  /** Spread on the form. */
  formProps: {
    action: (sent: FormData) => void;
    onSubmit: (event: FormEvent<HTMLFormElement>) => void;
    noValidate: true;
  };
}

/**
 * A form that is sent through a server action. It is never reset, so nothing typed is lost on a refusal.
 * @param onDone runs with the result before the form shows that it is done: go elsewhere, say thanks.
 */
export function useForm<R>(action: FormAction<R>, onDone?: (result: R) => unknown): Form<R> {
  const [state, dispatch, pending] = useActionState<ActionState<R>, FormData>(
    async (before, sent) => {
      const after = await action(before, sent);
      if (after.state === "done") await onDone?.(after.result);
      return after;
    },
    { state: "idle" },
  );
  const problems = problemsOf(state);
  return {
    state,
    pending,
    problems,
    errorOf: (path) => problems.find((problem) => problem.path === path)?.message,
    formProps: {
      noValidate: true,
      // Takes what is sent before the page has woken up: it waits, and never ends in the address bar.
      action: dispatch,
      // Once awake: sent by hand, because React empties a form that it sends itself.
      onSubmit: (event) => {
        event.preventDefault();
        const sent = new FormData(event.currentTarget);
        startTransition(() => dispatch(sent));
      },
    },
  };
}

function problemsOf<R>(state: ActionState<R>): readonly FieldMessage[] {
  if (state.state !== "refused") return [];
  return state.problems.length > 0 ? state.problems : [{ path: "", message: state.message }];
}
