import geodesic from "geographiclib-geodesic";
import { eq } from "drizzle-orm";
import { v7 } from "uuid";
import { describe, expect, it } from "vitest";
import { anchors, coastline, spans } from "@/db/schema";
import { createAnchor } from "@/lib/commands/create-anchor";
import { createSpan } from "@/lib/commands/create-span";
import { moveAnchor } from "@/lib/commands/move-anchor";
import { createAnchorInput, createSpanInput } from "@/lib/schemas/anchor";
import { accountDatabase } from "@/tests/support/account-database";
import { addArea, addCast, contextOf } from "@/tests/support/people";
import { addRegister } from "@/tests/support/register";

const db = accountDatabase("command_sea");

/** Length of the geodesic by GeographicLib (Karney 2013), m. */
function geographicLib(a: { lon: number; lat: number }, b: { lon: number; lat: number }): number {
  return geodesic.Geodesic.WGS84.Inverse(a.lat, a.lon, b.lat, b.lon).s12 ?? Number.NaN;
}

describe("a new anchor", () => {
  it("gets its distance to the recorded coast, with error and source; beyond its reach none; moved, a new one", async () => {
    const areaId = await addArea(db());
    const cast = await addCast(db(), areaId);
    const r = await addRegister(db(), { areaId, ...cast });
    // A shore along the equator, so that the nearest point has the anchor's own longitude.
    await db().insert(coastline).values({
      source: "Test shore",
      errorM: 12,
      coversM: 5000,
      geom: "SRID=4326;LINESTRING(-1 0, 1 0)",
    });
    const make = async (lat: number) => {
      const id = v7();
      const input = { id, siteId: r.siteId, label: "New", uses: ["highline"], point: { lon: 0.25, lat } };
      await createAnchor(contextOf(db(), cast.bolter), createAnchorInput.parse(input));
      return id;
    };
    const stored = async (id: string) => (await db().select().from(anchors).where(eq(anchors.id, id)))[0];

    const near = await make(0.01);
    const expected = geographicLib({ lon: 0.25, lat: 0.01 }, { lon: 0.25, lat: 0 });
    expect(await stored(near)).toMatchObject({ seaDistanceSource: "coast", seaDistanceErrorM: 12 });
    expect((await stored(near))?.seaDistanceM).toBeCloseTo(expected, 2);

    const far = await make(0.1);
    expect(await stored(far)).toMatchObject({ seaDistanceM: null, seaDistanceSource: null });

    const spanId = v7();
    const span = { id: spanId, anchorAId: near, anchorBId: far, name: "Over the bay" };
    await createSpan(contextOf(db(), cast.bolter), createSpanInput.parse(span));
    const move = { point: { lon: 0.25, lat: 0.02 }, reason: "Measured with a better receiver" };
    await moveAnchor(contextOf(db(), cast.bolter), { id: near, version: 1, move });
    const [row] = await db().select().from(spans).where(eq(spans.id, spanId));
    expect(row?.lengthM).toBeCloseTo(geographicLib(move.point, { lon: 0.25, lat: 0.1 }), 3);
    expect((await stored(near))?.seaDistanceM).toBeCloseTo(
      geographicLib(move.point, { lon: 0.25, lat: 0 }),
      2,
    );
  });
});
