"use client";

import { useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { FormSection } from "@/components/ui/form-section";
import { TextField } from "@/components/ui/text-field";

interface PlaceFieldsProps {
  values: Readonly<Record<string, string>>;
  point: { lon: number; lat: number } | null;
  errorOf: (path: string) => string | undefined;
}

/** Where, for something that is not in the register: typed, from the map, or from the device. */
export function PlaceFields({ values, point, errorOf }: PlaceFieldsProps) {
  const lat = useRef<HTMLInputElement>(null);
  const lon = useRef<HTMLInputElement>(null);
  const [answer, setAnswer] = useState<string | null>(null);

  const locate = () => {
    setAnswer("Asking the device…");
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        if (lat.current) lat.current.value = coords.latitude.toFixed(6);
        if (lon.current) lon.current.value = coords.longitude.toFixed(6);
        setAnswer(`Within about ${Math.round(coords.accuracy)} m.`);
      },
      () => setAnswer("The device did not give a position. Type it, or pick the place on the map."),
      { enableHighAccuracy: true, timeout: 15_000 },
    );
  };

  return (
    <FormSection title="Where is it?" step="3" intro="Degrees on WGS84, as maps and phones show them.">
      <div className="grid gap-5 sm:grid-cols-2">
        <TextField
          ref={lat}
          name="point.lat"
          label="Latitude"
          hint="North is positive: 46.9132"
          code
          inputMode="decimal"
          defaultValue={values["point.lat"] ?? point?.lat.toFixed(6)}
          error={errorOf("point.lat") ?? errorOf("point")}
        />
        <TextField
          ref={lon}
          name="point.lon"
          label="Longitude"
          hint="West is negative: -34.1884"
          code
          inputMode="decimal"
          defaultValue={values["point.lon"] ?? point?.lon.toFixed(6)}
          error={errorOf("point.lon")}
        />
      </div>
      <div className="flex flex-wrap items-center gap-3">
        <Button onClick={locate}>Use where I am</Button>
        <span role="status" className="text-sm text-muted">
          {answer}
        </span>
      </div>
    </FormSection>
  );
}
