/** @type {import('next').NextConfig} */
const config = {
  // Kept outside the bundle: Knex names database drivers that are not installed.
  serverExternalPackages: ['knex', 'pg'],
  poweredByHeader: false,
  reactStrictMode: true,
  // What is built is what is checked: a fault in a test must not keep the application from starting.
  typescript: { tsconfigPath: 'tsconfig.app.json' },
  // The test command builds beside a running application, into a folder of its own.
  ...(process.env.PINTLE_DIST_DIR ? { distDir: process.env.PINTLE_DIST_DIR } : {}),
};

export default config;
