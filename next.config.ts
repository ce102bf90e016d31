import type { NextConfig } from 'next'

/** Security headers that never vary; the content policy with its nonce is set in proxy.ts. */
const headers = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'camera=(self), geolocation=(self), microphone=()' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
  { key: 'Strict-Transport-Security', value: 'max-age=63072000; includeSubDomains' },
]

const config: NextConfig = {
  agentRules: false,
  poweredByHeader: false,
  devIndicators: false,
  reactStrictMode: true,
  turbopack: { root: import.meta.dirname },
  serverExternalPackages: ['knex', 'mysql2', 'exceljs', 'yauzl', '@node-rs/argon2'],
  headers: async () => [{ source: '/:path*', headers }],
}

export default config
