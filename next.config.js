/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  typedRoutes: false,
  // The server answers on loopback behind whatever the operator puts in front; nothing is fetched from elsewhere.
  images: { unoptimized: true },
  serverExternalPackages: ['pg', 'pino'],
};

export default config;
