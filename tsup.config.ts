import { defineConfig } from "tsup";

export default defineConfig({
  entry: ["src/**/*.ts"],
  format: ["esm"],
  target: "es2022",
  platform: "neutral",
  bundle: false,
  splitting: false,
  sourcemap: true,
  clean: true,
  dts: { compilerOptions: { ignoreDeprecations: "6.0", types: [] } },
});
