import path from "node:path";
import { defineConfig } from "vitest/config";

export default defineConfig({
  resolve: {
    alias: {
      "@": path.resolve(import.meta.dirname),
      // The guard only makes sense inside Next's bundler; in tests the marker is empty.
      "server-only": path.resolve(import.meta.dirname, "tests/fixtures/server-only.ts"),
    },
  },
  oxc: { jsx: { runtime: "automatic" } },
  test: {
    include: ["tests/{lib,db,app,arch}/**/*.test.{ts,tsx}"],
    environment: "node",
    testTimeout: 20_000,
  },
});
