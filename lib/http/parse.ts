import "server-only";
import type { z } from "zod";
import { AppError, type FieldProblem } from "@/lib/shared/errors";

/** All problems of an input, one entry a field path. */
export function problemsOf(error: z.ZodError): FieldProblem[] {
  return error.issues.map((issue) => ({ path: issue.path.map(String).join("."), message: issue.message }));
}

/** @throws AppError `invalid_input` naming every field that is wrong. */
export function parseOrRefuse<T extends z.ZodType>(schema: T, input: unknown): z.output<T> {
  const result = schema.safeParse(input);
  if (result.success) return result.data;
  const problems = problemsOf(result.error);
  const count = problems.length === 1 ? "One field" : `${problems.length} fields`;
  throw new AppError("invalid_input", `${count} cannot be used as sent.`, { problems });
}
