/** @type {import('next').NextConfig} */
const config = {
  // Kept outside the bundle: Knex names database drivers that are not installed.
  serverExternalPackages: ['knex', 'pg'],
  poweredByHeader: false,
  reactStrictMode: true,
  // The test command builds beside a running application, into a folder of its own.
  ...(process.env.PINTLE_DIST_DIR ? { distDir: process.env.PINTLE_DIST_DIR } : {}),
};

export default config;
