import type { NextConfig } from "next";

const config: NextConfig = {
  poweredByHeader: false,
  distDir: process.env.BYSSUS_DIST_DIR ?? ".next",
  serverExternalPackages: [
    "@node-rs/argon2",
    "rate-limiter-flexible",
    "pino",
    "sharp",
    "smtp-server",
    "mailparser",
    "nodemailer",
    "postgres",
  ],
  allowedDevOrigins: ["127.0.0.1"],
  typedRoutes: false,
  // `npm run check` checks types, tests included; a build checks nothing twice.
  typescript: { ignoreBuildErrors: true },
  experimental: {
    serverActions: { bodySizeLimit: "2mb" },
    // Writing the cache takes longer than the build it would shorten.
    turbopackFileSystemCacheForBuild: false,
  },
};

export default config;
