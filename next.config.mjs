/** @type {import('next').NextConfig} */
const nextConfig = {
  // Native or WASM-loading packages that must be required at run time, not bundled.
  serverExternalPackages: ['@electric-sql/pglite', '@node-rs/argon2', 'serialport', 'pino', 'pg'],
  poweredByHeader: false,
  // Passwords are arguments of server actions: they are never printed.
  logging: { serverFunctions: false },
  reactStrictMode: true,
  experimental: { authInterrupts: true },
  async headers() {
    return [
      {
        source: '/:path*',
        headers: [
          { key: 'X-Content-Type-Options', value: 'nosniff' },
          // Ticket and record addresses are secrets: never leak them in a referrer.
          { key: 'Referrer-Policy', value: 'no-referrer' },
          { key: 'X-Frame-Options', value: 'DENY' },
        ],
      },
    ];
  },
};

export default nextConfig;
