"use client";

import { useEffect, useRef } from "react";
import { Notice } from "@/components/ui/notice";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import type { ActionState } from "@/lib/shared/action-state";
import { flatValues } from "@/lib/shared/flat-values";

/** The version stored meanwhile, when a save was refused because of it; else the one the form was opened with. */
export function versionToSend(state: ActionState<unknown>, opened: string): string {
  const stored = state.state === "refused" ? state.current?.version : undefined;
  return typeof stored === "number" ? String(stored) : opened;
}

interface StaleNoticeProps {
  state: ActionState<unknown>;
  /** Names of the fields people know, by form name. */
  labels: Readonly<Record<string, string>>;
  /** Where what is stored now can be read. */
  href: string;
}

/** Somebody saved first: both versions, field by field. What was typed stays in the form below. */
export function StaleNotice({ state, labels, href }: StaleNoticeProps) {
  const box = useRef<HTMLDivElement>(null);
  const stale = isStale(state) ? state.current : undefined;
  useEffect(() => {
    if (stale) box.current?.focus();
  }, [stale]);
  if (!isStale(state) || !stale) return null;
  const stored = withUses(flatValues(stale));
  const typed = withUses(flatValues(state.values));
  const rows = Object.entries(labels).filter(([name]) => different(stored[name], typed[name]));
  return (
    <div ref={box} tabIndex={-1}>
      <Notice tone="warn" role="alert" title="Somebody saved this anchor while you were typing.">
        <Comparison rows={rows} stored={stored} typed={typed} />
        <p className="pt-2">
          {rows.length === 0
            ? "Nothing you typed differs from what is stored now. "
            : "Change below what should be different, then save again: that stores your version over theirs. "}
          <a href={href} className="underline">
            See what is stored now
          </a>
        </p>
      </Notice>
    </div>
  );
}

type Refused = Extract<ActionState<unknown>, { state: "refused" }>;

export function isStale(state: ActionState<unknown>): state is Refused {
  return state.state === "refused" && state.code === "stale_version";
}

interface ComparisonProps {
  rows: readonly (readonly [name: string, label: string])[];
  stored: Readonly<Record<string, string>>;
  typed: Readonly<Record<string, string>>;
}

function Comparison({ rows, stored, typed }: ComparisonProps) {
  if (rows.length === 0) return null;
  return (
    <Table caption="What is stored now and what you typed" className="mt-2">
      <TableHead>
        <tr>
          <Th>Field</Th>
          <Th>Stored now</Th>
          <Th>You typed</Th>
        </tr>
      </TableHead>
      <TableBody>
        {rows.map(([name, label]) => (
          <tr key={name}>
            <Th scope="row">{label}</Th>
            <Td>{stored[name] || "empty"}</Td>
            <Td>{typed[name] || "empty"}</Td>
          </tr>
        ))}
      </TableBody>
    </Table>
  );
}

function different(stored = "", typed = ""): boolean {
  const plain = (text: string) => text.trim().replace(",", ".").replace("−", "-");
  return plain(stored) !== plain(typed);
}

/** The uses as one text: which of them are ticked matters, not where in the list. */
function withUses(values: Record<string, string>): Record<string, string> {
  const uses = Object.entries(values).flatMap(([name, value]) => (name.startsWith("uses.") ? [value] : []));
  return { ...values, uses: uses.toSorted().join(", ").replaceAll("_", "-") };
}
