/**
 * Mutation testing with Stryker: changes operators, conditions and calls of a room, one at a time, and runs its tests.
 * npm run mutation               every room
 * npm run mutation -- air path   only these
 * npm run mutation -- sky --every=8   every eighth file of the room: the large rooms take hours in full
 * Stryker is fetched on demand into .cache (it is not in the lock file). Numbers are not its business: npm run nudge changes those.
 */
import { execFileSync, spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { ROOMS } from "../house/_rules.js";
import { filesUnder, ROOT } from "../_source.js";

const VERSION = "9.6.1";
const FOLDER = `${ROOT}.cache/stryker/`;

interface Report {
  readonly files: Readonly<
    Record<string, { readonly mutants: readonly { readonly status: string }[] }>
  >;
}

/** Fetches Stryker, once; vitest is the project's own. */
function install(): void {
  if (existsSync(`${FOLDER}node_modules/.bin/stryker`)) return;
  mkdirSync(FOLDER, { recursive: true });
  writeFileSync(`${FOLDER}package.json`, '{ "private": true }\n');
  const packages = [
    `@stryker-mutator/core@${VERSION}`,
    `@stryker-mutator/vitest-runner@${VERSION}`,
  ];
  const flags = ["--legacy-peer-deps", "--no-audit", "--no-fund", "--ignore-scripts"];
  execFileSync("npm", ["install", ...flags, ...packages], { cwd: FOLDER, stdio: "inherit" });
}

/** What a run on some files of a room found. */
interface Score {
  readonly noticed: number;
  readonly all: number;
  readonly files: string;
}

/** Changes in every `every`-th file of a room that tests noticed, and all of them. */
function score(room: string, every: number): Score {
  const files = filesUnder(`src/${room}`, ".ts").filter((path) => !path.endsWith("/index.ts"));
  const mutate = files.filter((_, i) => i % every === 0);
  const config = {
    mutate,
    testRunner: "vitest",
    vitest: { configFile: ".config/vitest.mutation.config.ts" },
    // texts of messages are tested by a few words only
    mutator: { excludedMutations: ["StringLiteral"] },
    reporters: ["json", "clear-text"],
    clearTextReporter: { allowColor: false, reportTests: false, reportScoreTable: false },
    jsonReporter: { fileName: `.cache/stryker/${room}.json` },
    tempDirName: ".cache/stryker-tmp",
    concurrency: 2,
    timeoutMS: 20_000,
    ignorePatterns: [".docs", ".cache", "dist", "coverage", "examples/out"],
    allowConsoleColors: false,
  };
  const path = `${FOLDER}${room}.config.json`;
  writeFileSync(path, JSON.stringify(config));
  const { status } = spawnSync(`${FOLDER}node_modules/.bin/stryker`, ["run", path], {
    cwd: ROOT,
    stdio: ["ignore", "inherit", "inherit"],
    env: { ...process.env, MUTATED_ROOM: room },
  });
  if (status !== 0) throw new Error(`Stryker ended with code ${status} in ${room}`);
  const report: Report = JSON.parse(readFileSync(`${FOLDER}${room}.json`, "utf8"));
  const states = Object.values(report.files).flatMap(({ mutants }) => mutants.map((m) => m.status));
  const counted = states.filter((state) => /Killed|Timeout|Survived|NoCoverage/.test(state));
  return {
    noticed: counted.filter((state) => /Killed|Timeout/.test(state)).length,
    all: counted.length,
    files: `${mutate.length} of ${files.length} files`,
  };
}

install();
const args = process.argv.slice(2);
const named = args.filter((arg) => !arg.startsWith("--"));
const every = Number(args.find((arg) => arg.startsWith("--every="))?.slice(8) ?? 1);
const lines = (named.length > 0 ? named : ROOMS)
  .filter((room) => existsSync(`${ROOT}test/${room}`))
  .map((room) => {
    const { noticed, all, files } = score(room, every);
    return `${room.padEnd(12)} ${files}: ${noticed} of ${all} noticed, ${((100 * noticed) / all).toFixed(1)} %`;
  });
console.log(lines.join("\n"));
