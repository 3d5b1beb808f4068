import { defineConfig } from "vitest/config";

/** The unit tests: sources only, no dist. The tests of the package are in vitest.package.config.ts. */
export default defineConfig({
  root: new URL("..", import.meta.url).pathname,
  test: {
    include: ["test/**/*.test.ts"],
    exclude: ["package", "examples", "site", "notebooks", "elsewhere"].map((one) => `test/${one}/**`),
    setupFiles: ["test/_seed.ts"],
    environment: "node",
    testTimeout: 60_000,
    coverage: { include: ["src/**"], reporter: ["text"] },
  },
});
