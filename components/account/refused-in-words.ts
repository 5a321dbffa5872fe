import type { ActionState } from "@/lib/shared/action-state";

/** Runs something that throws errors with words for the person, as a form's action. */
export async function refusedInWords(attempt: () => Promise<void>): Promise<ActionState<null>> {
  try {
    await attempt();
    return { state: "done", result: null };
  } catch (error) {
    const message = error instanceof Error ? error.message : "Something went wrong. Try again.";
    return { state: "refused", code: "not_signed_in", message, problems: [], values: null };
  }
}
