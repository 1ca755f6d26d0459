/** @type {import("next").NextConfig} */
const config = {
  // A second server on the same tree (the browser tests, a throw-away gallery) builds into a folder of its own.
  distDir: process.env.NEXT_DIST_DIR ?? ".next",
  poweredByHeader: false,
  // The development server would write what actions are called with into its log: passwords too.
  logging: { serverFunctions: false },
  // Native code and worker threads that a bundler would break.
  serverExternalPackages: ["sharp", "@node-rs/argon2", "graphile-worker", "pino", "rate-limiter-flexible"],
};

export default config;
