/** @type {import('next').NextConfig} */
const nextConfig = {
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: ['@mikro-orm/core', '@mikro-orm/postgresql', '@node-rs/argon2'],
};

export default nextConfig;
