/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  typedRoutes: false,
  // Types are checked by a part of their own in `npm test`; here they would make every first start a third longer.
  typescript: { ignoreBuildErrors: true },
  // The server answers on loopback behind whatever the operator puts in front; nothing is fetched from elsewhere.
  images: { unoptimized: true },
  serverExternalPackages: ['pg', 'pino'],
};

export default config;
