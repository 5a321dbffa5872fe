import "server-only";
import { notFound } from "next/navigation";
import { z } from "zod";
import { AppError } from "@/lib/shared/errors";

/** A page's read: absent and hidden both become the same "not found" page; everything else stays an error. */
export async function orNotFound<T>(read: Promise<T>): Promise<T> {
  try {
    return await read;
  } catch (error) {
    if (error instanceof AppError && error.code === "not_found") notFound();
    throw error;
  }
}

/** An id in the address that cannot be one belongs to nothing. */
export function idOrNotFound(id: string): string {
  const parsed = z.uuid().safeParse(id);
  if (!parsed.success) notFound();
  return parsed.data;
}
