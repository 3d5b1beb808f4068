import { defineConfig } from "vitest/config";

/** Tests of the built documentation (.docs) in a browser, and of the notebooks: they need dist and .docs, and skip what is not installed. */
export default defineConfig({
  root: new URL("..", import.meta.url).pathname,
  test: {
    include: ["test/site/**/*.test.ts", "test/notebooks/**/*.test.ts"],
    environment: "node",
    testTimeout: 600_000,
    hookTimeout: 120_000,
    fileParallelism: false,
  },
});
