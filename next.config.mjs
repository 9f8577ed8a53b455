/** @type {import("next").NextConfig} */
export default {
  agentRules: false,
  poweredByHeader: false,
  reactStrictMode: true,
  images: { unoptimized: true },
  serverExternalPackages: ["@node-rs/argon2", "pdfkit", "sharp", "postgres"],
  experimental: { authInterrupts: true },
};
