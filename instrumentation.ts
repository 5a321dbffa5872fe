/** Runs once when a server process starts. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { startMailLoop } = await import("@/lib/commands/mail-loop");
  await startMailLoop();
  const { startEvaluationLoop } = await import("@/lib/commands/evaluation/evaluation-loop");
  startEvaluationLoop();
}
