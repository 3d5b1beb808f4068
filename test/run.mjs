/**
 * Runs every check of the project, one line each, and prints the closing count.
 * node test/run.mjs            all steps but those on demand
 * node test/run.mjs --all      those too (they fetch something)
 * node test/run.mjs unit docs  only the named ones (dist must be built for those that need it)
 * Steps made of tests count their tests; the others count one each.
 */
import { spawn } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import { fileURLToPath } from "node:url";

const ROOT = fileURLToPath(new URL("..", import.meta.url));
/** Of a failed step's output; the first failures say most. */
const MOST_LINES = 300;
const RESULTS = `${ROOT}.cache/results/`;

const vitest = (name, config, ...rest) => ({
  name,
  report: `${RESULTS}${name}.json`,
  command: [
    ...["vitest", "run", "--config", `.config/${config}`, ...rest],
    ...["--reporter=dot", "--reporter=json", `--outputFile.json=${RESULTS}${name}.json`],
  ],
});

/** In order. `needs`: the steps whose success it depends on; `only`: a file without which there is nothing to run. */
const STEPS = [
  { name: "build", command: ["tsup", "--silent"] },
  {
    name: "lint",
    command: [
      "biome",
      "lint",
      "--config-path=.config",
      "--error-on-warnings",
      "src",
      "test",
      "examples",
      "docs",
    ],
  },
  {
    name: "format",
    command: ["biome", "format", "--config-path=.config", "src", "test", "examples", "docs"],
  },
  { name: "types", command: ["tsc", "--noEmit", "-p", "tsconfig.json"], needs: ["build"] },
  {
    name: "site types",
    command: ["tsc", "--noEmit", "-p", ".config/tsconfig.site.json"],
    needs: ["build"],
  },
  vitest(
    ...["unit", "vitest.config.ts", "--coverage", "--coverage.reporter=json-summary"],
    `--coverage.reportsDirectory=${RESULTS}coverage`,
  ),
  { name: "docs", command: ["tsx", "docs/site/build.ts"], needs: ["build"] },
  { ...vitest("examples", "vitest.package.config.ts", "test/examples"), needs: ["build"] },
  { ...vitest("package", "vitest.package.config.ts", "test/package"), needs: ["build", "docs"] },
  { ...vitest("site", "vitest.site.config.ts"), needs: ["build", "docs"] },
  {
    name: "start",
    command: ["tsx", "examples/station.ts"],
    needs: ["build"],
    only: "examples/station.ts",
  },
  {
    ...vitest("elsewhere", "vitest.package.config.ts", "test/elsewhere"),
    needs: ["build"],
    onDemand: true,
  },
  { name: "nodes", command: ["node", "test/package/nodes.mjs"], needs: ["build"], onDemand: true },
  { name: "nudge", command: ["tsx", "test/nudge/run.ts"], needs: ["unit"] },
];

/** Runs a command of node_modules/.bin; resolves to its exit code and everything it printed. */
function run([command, ...args]) {
  const program = command === "node" ? process.execPath : `${ROOT}node_modules/.bin/${command}`;
  const child = spawn(program, args, {
    cwd: ROOT,
    env: { ...process.env, NO_COLOR: "1", FORCE_COLOR: "0" },
  });
  let output = "";
  child.stdout.on("data", (data) => (output += data));
  child.stderr.on("data", (data) => (output += data));
  return new Promise((resolve) => {
    child.on("error", (error) => resolve({ code: 1, output: String(error) }));
    child.on("close", (code) => resolve({ code: code ?? 1, output }));
  });
}

/** Passed and failed of a finished step. */
function count(step, code) {
  const whole = code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
  if (step.report === undefined) return whole;
  if (!existsSync(step.report)) return { passed: 0, failed: 1 };
  const report = JSON.parse(readFileSync(step.report, "utf8"));
  const skipped = report.numPendingTests + report.numTodoTests;
  const dead = report.testResults.filter(
    (file) => file.status === "failed" && !file.assertionResults.some((a) => a.status === "failed"),
  ).length; // files that do not load
  const passed = report.numPassedTests;
  const failed = report.numFailedTests + dead;
  // an error between tests or an empty run fails without any failed test
  const silent = failed === 0 && (code !== 0 || passed === 0);
  return { passed, failed: silent ? 1 : failed, skipped };
}

/** Shares of statements, branches and functions that a step's tests ran, if it counted them. */
function coverage() {
  const path = `${RESULTS}coverage/coverage-summary.json`;
  if (!existsSync(path)) return "";
  const { statements, branches, functions } = JSON.parse(readFileSync(path, "utf8")).total;
  rmSync(path);
  return `; ran ${statements.pct} % of statements, ${branches.pct} % of branches, ${functions.pct} % of functions`;
}

const args = process.argv.slice(2);
const all = args.includes("--all");
const wanted = args.filter((arg) => arg !== "--all");
const unknown = wanted.filter((name) => !STEPS.some((step) => step.name === name));
if (unknown.length > 0) {
  console.error(
    `no such step: ${unknown.join(", ")}; there are ${STEPS.map((s) => s.name).join(", ")}`,
  );
  process.exit(2);
}

rmSync(RESULTS, { recursive: true, force: true });
mkdirSync(RESULTS, { recursive: true });
const failures = [];
const total = { passed: 0, failed: 0 };
for (const step of STEPS) {
  const chosen = wanted.length > 0 ? wanted.includes(step.name) : all || !step.onDemand;
  if (!chosen) continue;
  const name = step.name.padEnd(10);
  const missing = (step.needs ?? []).find((need) => failures.includes(need));
  if (step.only !== undefined && !existsSync(ROOT + step.only)) {
    console.log(`${name}        skipped: there is no ${step.only}`);
    continue;
  }
  if (missing !== undefined) {
    console.log(`${name}        not run: ${missing} failed`);
    failures.push(step.name);
    total.failed += 1;
    continue;
  }
  const start = performance.now();
  const { code, output } = await run(step.command);
  const seconds = ((performance.now() - start) / 1000).toFixed(1).padStart(6);
  const { passed, failed, skipped = 0 } = count(step, code);
  total.passed += passed;
  total.failed += failed;
  const detail = step.report
    ? ` ${passed} passed, ${failed} failed${skipped ? `, ${skipped} skipped` : ""}${coverage()}`
    : "";
  console.log(`${name}${seconds} s ${failed === 0 ? "ok" : "FAILED"}${detail}`);
  if (failed > 0) {
    failures.push(step.name);
    console.log(
      output.trimEnd().split("\n").slice(0, MOST_LINES).join("\n").replace(/^/gm, "  | "),
    );
  }
}
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 ? 0 : 1;
