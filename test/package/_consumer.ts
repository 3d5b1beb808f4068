/** Set-up of the package tests: packs the project as it would be published and installs it, offline, in an empty folder. */
import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { TestProject } from "vitest/node";
import { ROOT } from "../_source.js";

declare module "vitest" {
  export interface ProvidedContext {
    /** Folder with the package installed. */
    consumer: string;
    /** Path of the packed tarball. */
    tarball: string;
    /** Paths in the tarball. */
    contents: string[];
  }
}

/** Runs npm in `folder`, without a network. */
function npm(folder: string, ...args: string[]): string {
  return execFileSync(
    "npm",
    [...args, "--offline", "--no-audit", "--no-fund", "--ignore-scripts"],
    {
      cwd: folder,
      encoding: "utf8",
      stdio: ["ignore", "pipe", "pipe"],
    },
  );
}

/** Called by vitest once before the package tests; what it returns is called after them. */
export function setup(project: TestProject): () => void {
  const consumer = mkdtempSync(join(tmpdir(), "airlight-consumer-"));
  const [packed] = JSON.parse(npm(ROOT, "pack", "--json", "--pack-destination", consumer));
  const tarball = join(consumer, packed.filename);
  const packageJson = { name: "consumer", version: "1.0.0", private: true, type: "module" };
  writeFileSync(join(consumer, "package.json"), JSON.stringify(packageJson));
  npm(consumer, "install", tarball);
  const installed = JSON.parse(readFileSync(join(consumer, "package-lock.json"), "utf8"));
  const packages = Object.keys(installed.packages).filter((path) => path !== "");
  if (packages.join() !== "node_modules/airlight")
    throw new Error(`the tarball installs more than itself: ${packages.join(", ")}`);
  project.provide("consumer", consumer);
  project.provide("tarball", tarball);
  project.provide(
    "contents",
    packed.files.map((file: { path: string }) => file.path),
  );
  return () => rmSync(consumer, { recursive: true, force: true });
}
