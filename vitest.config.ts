import react from "@vitejs/plugin-react";
import { defineConfig } from "vitest/config";

const alias = {
  "@": new URL("./src", import.meta.url).pathname,
  "server-only": new URL("./src/testing/server-only.ts", import.meta.url).pathname,
};

export default defineConfig({
  plugins: [react()],
  resolve: { alias },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          environment: "node",
          include: ["src/{domain,lib,components,verify}/**/*.test.ts", "src/*.test.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "ui",
          environment: "jsdom",
          include: ["src/**/*.test.tsx"],
          setupFiles: ["./src/testing/setup-ui.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "db",
          environment: "node",
          include: ["src/{db,features,testing,app}/**/*.test.ts"],
          globalSetup: ["./src/testing/database.ts"],
          testTimeout: 30_000,
          hookTimeout: 60_000,
          sequence: { groupOrder: 1 },
          maxWorkers: 2,
        },
      },
    ],
  },
});
