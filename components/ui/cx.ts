import { clsx, type ClassValue } from "clsx";
import { twMerge } from "tailwind-merge";

/** Joins class names; of two that set the same thing the later one wins. */
export function cx(...values: ClassValue[]): string {
  return twMerge(clsx(values));
}
