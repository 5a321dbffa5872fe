import "server-only";
import { notFound } from "next/navigation";
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
