"use client";

/**
 * Turns a single-use secret into a session on this device and opens `to` with a full load, so that nothing
 * read before as somebody else stays on the screen.
 * @throws Error with words for the person when the secret is not taken.
 */
export async function enterWithSecret(secret: string, to: string): Promise<void> {
  await enter("link", { secret }, to, "This link was used already or has expired. Ask for a new one.");
}

/** @throws Error with words for the person: wrong e-mail or password, or too many tries. */
export async function enterWithPassword(email: string, password: string, to: string): Promise<void> {
  await enter("password", { email, password }, to, "E-mail and password do not belong together.");
}

async function enter(
  provider: "link" | "password",
  proof: Record<string, string>,
  to: string,
  refusal: string,
): Promise<void> {
  const { signIn } = await import("next-auth/react");
  const answer = await signIn(provider, { ...proof, redirect: false });
  if (answer?.error) throw new Error(answer.error === "CredentialsSignin" ? refusal : answer.error);
  if (!answer?.ok) throw new Error("Byssus did not answer. Check the connection and try again.");
  window.location.assign(to);
}
