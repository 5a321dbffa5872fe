"use client";

import { useCallback, useMemo, useSyncExternalStore } from "react";

export interface Draft {
  /** What was typed before, by field name; empty when nothing was kept. */
  values: Readonly<Record<string, string>>;
  /** Something was kept: say so beside the form. */
  restored: boolean;
  /** Give it to the form as its key: fields take their first value only when they are made. */
  formKey: string;
  /** Keeps everything typed so far on this device. */
  keep: (form: HTMLFormElement) => void;
  /** Forgets it: the server has answered that it is stored. */
  forget: () => void;
}

const PREFIX = "byssus-draft:";
const seen = new Map<string, string | null>();

/**
 * A form's text kept on the device at every change, so that a reload, a dead battery or a lost signal loses
 * nothing. Files are not kept. Reading happens once per page load; a browser that forbids storage keeps nothing.
 */
export function useDraft(name: string): Draft {
  const key = PREFIX + name;
  const raw = useSyncExternalStore(
    subscribeToNothing,
    () => readOnce(key),
    () => null,
  );
  const values = useMemo(() => parsed(raw), [raw]);
  const keep = useCallback(
    (form: HTMLFormElement) => {
      const text = [...new FormData(form)].filter(
        (entry): entry is [string, string] => typeof entry[1] === "string",
      );
      attempt(() => localStorage.setItem(key, JSON.stringify(Object.fromEntries(text))));
    },
    [key],
  );
  const forget = useCallback(() => {
    seen.set(key, null);
    attempt(() => localStorage.removeItem(key));
  }, [key]);
  const restored = Object.keys(values).length > 0;
  return { values, restored, formKey: restored ? "draft" : "fresh", keep, forget };
}

function subscribeToNothing(): () => void {
  return () => undefined;
}

function readOnce(key: string): string | null {
  const known = seen.get(key);
  if (known !== undefined) return known;
  const raw = attempt(() => localStorage.getItem(key)) ?? null;
  seen.set(key, raw);
  return raw;
}

function attempt<T>(work: () => T): T | undefined {
  try {
    return work();
  } catch {
    return undefined;
  }
}

function parsed(raw: string | null): Record<string, string> {
  const value: unknown = raw === null ? null : attempt(() => JSON.parse(raw));
  if (typeof value !== "object" || value === null) return {};
  return Object.fromEntries(
    Object.entries(value).filter((entry): entry is [string, string] => typeof entry[1] === "string"),
  );
}
