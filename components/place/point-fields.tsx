"use client";

import { useState } from "react";
import { PlanPicker } from "@/components/place/plan-picker";
import { Button } from "@/components/ui/button";
import { NumberField } from "@/components/ui/number-field";
import { TextField } from "@/components/ui/text-field";

interface PointFieldsProps {
  kept: Readonly<Record<string, string>>;
  marks: readonly { lon: number; lat: number; name: string }[];
  errorOf: (path: string) => string | undefined;
}

/** Where an anchor is: tapped on the plan, from the device, or typed. */
export function PointFields({ kept, marks, errorOf }: PointFieldsProps) {
  const [lat, setLat] = useState(kept["point.lat"] ?? "");
  const [lon, setLon] = useState(kept["point.lon"] ?? "");
  const [error, setError] = useState(kept.pointErrorM ?? "");
  const [answer, setAnswer] = useState<string | null>(null);
  const set = (at: { lon: number; lat: number }) => {
    setLat(at.lat.toFixed(6));
    setLon(at.lon.toFixed(6));
  };
  const locate = () => {
    setAnswer("Asking the device…");
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        set({ lon: coords.longitude, lat: coords.latitude });
        setError(String(Math.round(coords.accuracy)));
        setAnswer(`Within about ${Math.round(coords.accuracy)} m.`);
      },
      () => setAnswer("The device did not give a position. Type it, or tap the plan."),
      { enableHighAccuracy: true, timeout: 15_000 },
    );
  };
  const typed = { lon: Number(lon.replace(",", ".")), lat: Number(lat.replace(",", ".")) };
  const usable = lat !== "" && lon !== "" && Math.abs(typed.lat) <= 90 && Math.abs(typed.lon) <= 180;

  return (
    <div className="grid gap-5">
      <PlanPicker marks={marks} picked={usable ? typed : null} onPick={set} />
      <div className="flex flex-wrap items-center gap-3">
        <Button onClick={locate}>Use where I am</Button>
        <span role="status" className="text-sm text-muted">
          {answer}
        </span>
      </div>
      <div className="grid gap-5 sm:grid-cols-3">
        <TextField
          name="point.lat"
          label="Latitude"
          hint="Degrees, north is positive"
          code
          inputMode="decimal"
          value={lat}
          onChange={(event) => setLat(event.currentTarget.value)}
          error={errorOf("point.lat") ?? errorOf("point")}
        />
        <TextField
          name="point.lon"
          label="Longitude"
          hint="Degrees, west is negative"
          code
          inputMode="decimal"
          value={lon}
          onChange={(event) => setLon(event.currentTarget.value)}
          error={errorOf("point.lon")}
        />
        <NumberField
          name="pointErrorM"
          label="Known within"
          unit="m"
          hint="A phone: about 5"
          value={error}
          onChange={(event) => setError(event.currentTarget.value)}
          error={errorOf("pointErrorM")}
          optional
        />
      </div>
    </div>
  );
}
