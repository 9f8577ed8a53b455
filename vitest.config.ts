import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const inProject = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export default defineConfig({
  resolve: {
    alias: {
      "@": inProject("src"),
      // Throws wherever nobody tells a server from a browser; the tests are the server.
      "server-only": inProject("tests/support/server-only.ts"),
    },
  },
  test: {
    allowOnly: false,
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          include: ["tests/**/*.test.ts", "tests/**/*.test.tsx"],
          exclude: ["tests/data/**", "tests/browser/**"],
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: "data",
          include: ["tests/data/**/*.test.ts"],
          globalSetup: ["tests/support/make-template.ts"],
          setupFiles: ["tests/support/own-database.ts"],
          maxWorkers: 2,
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
