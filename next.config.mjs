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
          // Ticket and record addresses are secrets: no other site learns them from a referrer. With
          // `no-referrer` a browser would keep a form's origin back too, and the post would refuse it.
          { key: 'Referrer-Policy', value: 'same-origin' },
          { key: 'X-Frame-Options', value: 'DENY' },
          // What a page of ours never does: plug-ins, another base, forms to and frames of others.
          {
            key: 'Content-Security-Policy',
            value: "object-src 'none'; base-uri 'self'; form-action 'self'; frame-ancestors 'none'",
          },
        ],
      },
    ];
  },
};

export default nextConfig;
