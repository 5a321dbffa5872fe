// What a start may be told from outside: through the environment, or lines of `.env.local`.
import { existsSync, mkdirSync } from "node:fs";
import path from "node:path";
import { local, root } from "./paths.mjs";
import { secret } from "./secrets.mjs";

/**
 * PORT            first port to try (3000)
 * BYSSUS_HOST     address to listen on (127.0.0.1)
 * BYSSUS_DEMO     1 (the default) for the demo, 0 for a real installation
 * DATABASE_URL    a PostgreSQL 15+ database with PostGIS, instead of a cluster of our own
 * BYSSUS_URL      the public address, when it differs from the one listened on
 */
export function readSettings() {
  const file = path.join(root, ".env.local");
  if (existsSync(file)) process.loadEnvFile(file);
  const { PORT = "3000", BYSSUS_HOST = "127.0.0.1", DATABASE_URL } = process.env;
  const { BYSSUS_DEMO = "1" } = process.env;
  if (BYSSUS_DEMO !== "0" && BYSSUS_DEMO !== "1") {
    throw new Error(`BYSSUS_DEMO must be 0 or 1, not "${BYSSUS_DEMO}".`);
  }
  const mode = BYSSUS_DEMO === "1" ? "demo" : "production";
  const port = Number(PORT);
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    throw new Error(`PORT must be a port, not "${PORT}".`);
  }
  return { mode, port, host: BYSSUS_HOST, givenUrl: DATABASE_URL || null };
}

/** Demo and real data never share a database. */
export const databaseName = (mode) => (mode === "demo" ? "byssus_demo" : "byssus");

/** Where photos of our own installation are kept when BYSSUS_DATA_DIR says nothing else. */
export const ownPhotos = (mode) => path.join(local, "data", mode);

/** The environment of the application and of the scripts that work on its database. */
export function applicationEnv({ mode, databaseUrl, address, sinkPort, nodeEnv = "production" }) {
  const photos = process.env.BYSSUS_DATA_DIR ?? ownPhotos(mode);
  mkdirSync(photos, { recursive: true });
  return {
    ...process.env,
    NODE_ENV: nodeEnv,
    NEXT_TELEMETRY_DISABLED: "1",
    BYSSUS_DEMO: mode === "demo" ? "1" : "0",
    BYSSUS_URL: process.env.BYSSUS_URL ?? address,
    BYSSUS_DATA_DIR: photos,
    BYSSUS_SINK_PORT: String(sinkPort),
    DATABASE_URL: databaseUrl,
    NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET ?? secret(local, `session-secret-${mode}`),
    NEXTAUTH_URL: process.env.NEXTAUTH_URL ?? process.env.BYSSUS_URL ?? address,
  };
}
