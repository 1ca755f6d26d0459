/** @type {import("next").NextConfig} */
const config = {
  // A second server on the same tree (the browser tests, a throw-away gallery) builds into a folder of its own.
  distDir: process.env.NEXT_DIST_DIR ?? ".next",
  poweredByHeader: false,
  // The development server would write what actions are called with into its log: passwords too.
  logging: { serverFunctions: false },
  // A pin map of 10,000 rows with long notes is taken in one change.
  experimental: { serverActions: { bodySizeLimit: "5mb" } },
  // Native code and worker threads that a bundler would break.
  serverExternalPackages: ["sharp", "@node-rs/argon2", "graphile-worker", "pino", "rate-limiter-flexible"],
};

export default config;
