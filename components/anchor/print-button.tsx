"use client";

import { Button } from "@/components/ui/button";

/** Prints the sheet as an A4 drawing. */
export function PrintButton() {
  return <Button onClick={() => window.print()}>Print</Button>;
}
