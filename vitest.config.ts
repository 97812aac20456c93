import { defineConfig } from "vitest/config";

const BROWSER = "test/browser/**/*.test.ts";

export default defineConfig({
  test: {
    testTimeout: 60_000,
    hookTimeout: 120_000,
    pool: "threads",
    setupFiles: ["test/support/seed.ts"],
    projects: [
      {
        extends: true,
        test: { name: "code", include: ["test/**/*.test.ts"], exclude: [BROWSER], sequence: { groupOrder: 0 } },
      },
      {
        // A browser beside other heavy tests on two cores is slow enough to time out: these run afterwards, one file at a time.
        extends: true,
        test: { name: "browser", include: [BROWSER], fileParallelism: false, sequence: { groupOrder: 1 } },
      },
    ],
  },
});
