import type { NextConfig } from 'next';

/** Headers that do not change from request to request; the content security policy is set in proxy.ts. */
const SECURITY_HEADERS = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Permissions-Policy', value: 'camera=(self), geolocation=(), microphone=()' },
];

const config: NextConfig = {
  poweredByHeader: false,
  // Native or self-loading packages that a bundler would break.
  serverExternalPackages: ['@node-rs/argon2', 'graphile-worker', 'pg', 'pg-copy-streams', 'pino'],
  headers: async () => [{ source: '/:path*', headers: SECURITY_HEADERS }],
};

export default config;
