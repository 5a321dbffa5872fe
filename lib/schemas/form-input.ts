import { z } from "zod";

/**
 * The same schema, fed by a form. A form sends only text, so each value is turned into what its field wants: an
 * empty one into null (never into 0), `12,4` and `12.4` into a number, a ticked box into true. Text that is no
 * number stays text and gets the field's own message. Names the schema does not know are left out.
 */
export function formInput<T extends z.ZodType>(schema: T) {
  return z.preprocess((value) => fitted(schema, value), schema);
}

function fitted(schema: unknown, value: unknown): unknown {
  if (schema instanceof z.ZodOptional || schema instanceof z.ZodDefault || schema instanceof z.ZodPrefault) {
    const inner = schema.unwrap();
    return value === "" && !takesNull(inner) ? undefined : fitted(inner, value);
  }
  if (schema instanceof z.ZodNullable) return value === "" ? null : fitted(schema.unwrap(), value);
  if (schema instanceof z.ZodPipe) {
    return fitted(schema.in instanceof z.ZodTransform ? schema.out : schema.in, value);
  }
  if (schema instanceof z.ZodNumber) return typeof value === "string" ? numberOf(value) : value;
  if (schema instanceof z.ZodBoolean) return booleanOf(value);
  if (schema instanceof z.ZodArray) return listOf(value).map((entry) => fitted(schema.element, entry));
  if (schema instanceof z.ZodObject && isRecord(value)) {
    return Object.fromEntries(
      Object.entries(schema.shape)
        .filter(([key]) => key in value)
        .map(([key, field]) => [key, fitted(field, value[key])]),
    );
  }
  if (schema instanceof z.ZodRecord && isRecord(value)) {
    return Object.fromEntries(Object.entries(value).map(([key, entry]) => [key, looselyFitted(entry)]));
  }
  return value;
}

function takesNull(schema: unknown): boolean {
  return schema instanceof z.ZodNullable;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}

/** A decimal comma is a point; empty is nothing. */
function numberOf(value: string): unknown {
  const typed = value.trim().replace("−", "-");
  if (typed === "") return null;
  return /^[+-]?\d+([.,]\d+)?$/.test(typed) ? Number(typed.replace(",", ".")) : value;
}

function booleanOf(value: unknown): unknown {
  if (value === "true" || value === "on" || value === "yes") return true;
  if (value === "false" || value === "off" || value === "no") return false;
  return value === "" ? null : value;
}

/** `placements.0.kind` arrives as an object with numbered keys. */
function listOf(value: unknown): unknown[] {
  if (Array.isArray(value)) return value;
  if (isRecord(value)) {
    return Object.entries(value)
      .toSorted(([a], [b]) => Number(a) - Number(b))
      .map(([, entry]) => entry);
  }
  return value === undefined || value === "" || value === null ? [] : [value];
}

/** Values of an open record, where only the text itself says what it is. */
function looselyFitted(value: unknown): unknown {
  if (typeof value !== "string") return value;
  if (value === "") return null;
  if (value === "true" || value === "false") return value === "true";
  return numberOf(value);
}
