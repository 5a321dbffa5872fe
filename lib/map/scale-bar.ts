/** Metres on the ground under one CSS pixel, in the web's Mercator projection with tiles of 512 pixels. */
export function metresPerPixel(latDeg: number, zoom: number): number {
  const equatorM = 2 * Math.PI * 6_378_137;
  return (equatorM * Math.cos((latDeg * Math.PI) / 180)) / (512 * 2 ** zoom);
}

/** The longest bar of 1, 2 or 5 times a power of ten that fits: its length on the ground and on the screen. */
export function scaleBar(perPixelM: number, mostPx: number): { lengthM: number; widthPx: number } {
  if (!(perPixelM > 0) || !(mostPx > 0)) throw new RangeError("both must be positive");
  const mostM = perPixelM * mostPx;
  const power = 10 ** Math.floor(Math.log10(mostM));
  const factor = [5, 2, 1].find((digit) => digit * power <= mostM * (1 + 1e-12)) ?? 1;
  const lengthM = factor * power;
  return { lengthM, widthPx: lengthM / perPixelM };
}
