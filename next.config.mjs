import { securityHeaders, engineHeaders } from './scripts/build/response-headers.mjs';

/** @type {import('next').NextConfig} */
const config = {
  distDir: process.env.HOLDOFF_DIST_DIR || '.next',
  // Types are checked by `npm test`; a start need not wait for them.
  typescript: { ignoreBuildErrors: true },
  poweredByHeader: false,
  reactStrictMode: true,
  // Native modules and workers that must stay files of their own.
  serverExternalPackages: ['@node-rs/argon2', 'eecircuit-engine', 'elkjs', 'lib0', 'mysql2', 'pino', 'y-protocols', 'y-websocket', 'yjs'],
  headers: async () => [
    { source: '/:path*', headers: securityHeaders },
    { source: '/vendor/:path*', headers: engineHeaders },
  ],
};

export default config;
