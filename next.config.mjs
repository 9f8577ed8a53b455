/** @type {import("next").NextConfig} */
export default {
  // The tests build beside a served application, never over it.
  distDir: process.env.EVENRAIL_BUILD_FOLDER ?? ".next",
  agentRules: false,
  poweredByHeader: false,
  reactStrictMode: true,
  images: { unoptimized: true },
  serverExternalPackages: ["@node-rs/argon2", "pdfkit", "sharp", "postgres"],
  experimental: { authInterrupts: true },
};
