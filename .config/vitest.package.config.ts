import { defineConfig } from "vitest/config";

/** Tests of what is shipped: they need dist (npm run build) and, for the documentation, .docs (npm run docs). */
export default defineConfig({
  root: new URL("..", import.meta.url).pathname,
  test: {
    include: ["test/package/**/*.test.ts", "test/examples/**/*.test.ts", "test/elsewhere/**/*.test.ts"],
    globalSetup: ["test/package/_consumer.ts"],
    environment: "node",
    testTimeout: 180_000,
    hookTimeout: 180_000,
  },
});
