import { defineConfig } from "vitest/config";

/** The unit tests of one room, for mutation testing. */
export default defineConfig({
  test: {
    include: [`test/${process.env.MUTATED_ROOM ?? "*"}/**/*.test.ts`],
    setupFiles: ["test/_seed.ts"],
    environment: "node",
    testTimeout: 60_000,
  },
});
