import { customType } from "drizzle-orm/pg-core";

/** WGS84, longitude first, as everywhere in the product. */
export interface LonLat {
  lon: number;
  lat: number;
}

/**
 * PostGIS point, SRID 4326. Written as EWKT so the SRID is never lost; read from the EWKB hex that the
 * server sends (byte order, type with SRID flag, SRID, x, y).
 */
export const point = customType<{ data: LonLat; driverData: string }>({
  dataType: () => "geometry(Point,4326)",
  toDriver: ({ lon, lat }) => `SRID=4326;POINT(${lon} ${lat})`,
  fromDriver: (hex) => {
    const bytes = Buffer.from(hex, "hex");
    const little = bytes.readUInt8(0) === 1;
    const read = (offset: number) => (little ? bytes.readDoubleLE(offset) : bytes.readDoubleBE(offset));
    return { lon: read(9), lat: read(17) };
  },
});

/** PostGIS line or polygon of any shape, kept as EWKT on the way in; read through ST_AsGeoJSON in queries. */
export const shape = customType<{ data: string; driverData: string }>({
  dataType: () => "geometry(Geometry,4326)",
});
