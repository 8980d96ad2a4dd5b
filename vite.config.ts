import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vitest/config";

export default defineConfig({
  plugins: [react(), tailwindcss()],
  publicDir: "client/public",
  build: {
    outDir: "dist/client",
    emptyOutDir: true,
    target: "es2022",
    modulePreload: { polyfill: false },
    manifest: true,
    sourcemap: false,
  },
  test: {
    // How long a test waits for what must come: generous, since it passes as soon as it has come.
    expect: { poll: { timeout: 20_000 } },
    testTimeout: 30_000,
    hookTimeout: 60_000,
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          include: ["tests/shared/**/*.test.ts", "tests/fakes/**/*.test.ts", "tests/launch/**/*.test.ts"],
          environment: "node",
        },
      },
      {
        extends: true,
        test: {
          name: "client",
          include: ["tests/client/**/*.test.{ts,tsx}"],
          environment: "jsdom",
          setupFiles: ["tests/support/dom.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "server",
          include: ["tests/server/**/*.test.ts"],
          environment: "node",
          globalSetup: ["tests/support/globalDatabase.ts"],
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: "browser",
          include: ["tests/e2e/**/*.test.ts"],
          environment: "node",
          globalSetup: ["tests/support/globalSite.ts"],
          testTimeout: 300_000,
          hookTimeout: 300_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
