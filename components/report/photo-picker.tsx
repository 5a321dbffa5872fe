"use client";

import { useId } from "react";
import { Button } from "@/components/ui/button";
import { formatQuantity } from "@/lib/shared/format";

export interface PickedPhoto {
  id: string;
  file: File;
  state: "waiting" | "sending" | "sent" | "refused";
  /** 0 to 1 while sending. */
  part: number;
  problem: string | null;
}

interface PhotoPickerProps {
  photos: readonly PickedPhoto[];
  onAdd: (files: readonly File[]) => void;
  onRemove: (id: string) => void;
  onRetry?: (id: string) => void;
  label?: string;
  hint?: string;
  error?: string;
  /** What an error summary links to. */
  id?: string;
  /** At least one is needed: does not say "optional". */
  needed?: boolean;
}

/** Camera or files; each photo with its own state, so one that is refused does not hold up the others. */
export function PhotoPicker({
  photos,
  onAdd,
  onRemove,
  onRetry,
  label = "Photos",
  hint,
  error,
  id,
  needed = false,
}: PhotoPickerProps) {
  const ownId = useId();
  const inputId = id ?? ownId;
  return (
    <div className="grid gap-2">
      <label htmlFor={inputId} className="text-base font-semibold">
        {label}
        {needed ? null : <span className="font-normal text-muted"> (optional)</span>}
      </label>
      <p id={`${inputId}-hint`} className="text-sm text-muted">
        {hint ??
          "JPEG, PNG or WebP, at most 20 MB each. Location and serial numbers are taken out of the copies others see."}
      </p>
      {error ? <p className="text-sm font-semibold text-stop">{error}</p> : null}
      <input
        id={inputId}
        type="file"
        multiple
        accept="image/jpeg,image/png,image/webp"
        aria-describedby={`${inputId}-hint`}
        className="touch w-full cursor-pointer rounded-md border border-dashed border-line-strong bg-raised p-2 file:mr-3 file:cursor-pointer file:rounded-md file:border file:border-solid file:border-action file:bg-surface file:px-3 file:py-2 file:font-label file:font-semibold file:text-action"
        onChange={(event) => {
          onAdd([...(event.currentTarget.files ?? [])]);
          event.currentTarget.value = "";
        }}
      />
      {photos.length > 0 ? (
        <ul className="divide-y divide-line border-y border-line" aria-label="Chosen photos">
          {photos.map((photo) => (
            <li key={photo.id} className="grid gap-1 py-2">
              <div className="flex flex-wrap items-center justify-between gap-2">
                <span className="min-w-0 break-all">
                  {photo.file.name}{" "}
                  <span className="type-figure text-sm text-muted">
                    {formatQuantity(photo.file.size / 1e6, "MB", { digits: 1 })}
                  </span>
                </span>
                <span className="flex items-center gap-2">
                  <span role="status" className="type-label">
                    {STATES[photo.state]}
                  </span>
                  {photo.state === "refused" && onRetry ? (
                    <Button onClick={() => onRetry(photo.id)}>Try again</Button>
                  ) : null}
                  {photo.state === "waiting" || photo.state === "refused" ? (
                    <Button
                      tone="quiet"
                      onClick={() => onRemove(photo.id)}
                      aria-label={`Leave out ${photo.file.name}`}
                    >
                      Leave out
                    </Button>
                  ) : null}
                </span>
              </div>
              {photo.state === "sending" ? (
                <progress
                  value={photo.part}
                  max={1}
                  className="h-1.5 w-full accent-action"
                  aria-label={`Sending ${photo.file.name}`}
                />
              ) : null}
              {photo.problem ? <p className="text-sm font-semibold text-stop">{photo.problem}</p> : null}
            </li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}

const STATES: Readonly<Record<PickedPhoto["state"], string>> = {
  waiting: "goes with it",
  sending: "sending",
  sent: "sent",
  refused: "not taken",
};
