import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { ROOT } from "../_source.js";

/** Folders that are not part of the repository. */
const OUTSIDE = new Set([".git", "node_modules", "dist", ".docs", ".cache", "coverage", "out"]);

/** Every file of the repository, relative to it. */
function repositoryFiles(folder = ""): string[] {
  return readdirSync(ROOT + folder, { withFileTypes: true }).flatMap((entry) => {
    if (OUTSIDE.has(entry.name)) return [];
    return entry.isDirectory() ? repositoryFiles(`${folder}${entry.name}/`) : [folder + entry.name];
  });
}

/** Paths that exist on one machine only, and hosts a lock file can name; written in pieces so that this file does not match. */
const PRIVATE = new RegExp(
  [
    ...["work", "tmp", "root", "home", "Users", "mnt"].map(
      (folder) => `(?<![\\w.)}/-])/${folder}/`,
    ),
    "[A-Z]:\\\\\\\\",
    "regis" + "try\\.",
    "local" + "host:\\d{4,5}/npm",
    '"resol' + 'ved":',
  ].join("|"),
);

describe("the repository", () => {
  it("names no path of one machine and no package host", () => {
    const files = repositoryFiles();
    expect(files).toContain("package-lock.json");
    const naming = files.filter((path) => PRIVATE.test(readFileSync(ROOT + path, "utf8")));
    expect(naming).toEqual([]);
  });

  it("would notice one", () => {
    for (const text of [
      "/" + "work/main",
      'from "/' + 'tmp/x"',
      "https://regis" + "try.example/",
      "(/" + "root/.x",
    ])
      expect(PRIVATE.test(text), text).toBe(true);
    for (const text of ["examples/tmpfile", "W m-2/tmp", "../shared/home/"])
      expect(PRIVATE.test(text), text).toBe(false);
  });

  it("keeps package.json pinned exactly and free of runtime dependencies", () => {
    const packageJson = JSON.parse(readFileSync(`${ROOT}package.json`, "utf8"));
    expect(packageJson.dependencies).toBeUndefined();
    expect(packageJson.peerDependencies).toBeUndefined();
    expect(packageJson.sideEffects).toBe(false);
    for (const [name, version] of Object.entries(packageJson.devDependencies))
      expect(version, name).toMatch(/^\d+\.\d+\.\d+$/);
  });
});
