/**
 * Imports and requires the built package in newer versions of Node, fetched through npx (needs a network the first time).
 * node test/run.mjs nodes
 */
import { spawnSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";

const VERSIONS = ["22", "24"];
const cwd = fileURLToPath(new URL("../..", import.meta.url));
const { exports } = JSON.parse(readFileSync(`${cwd}package.json`, "utf8"));
const specifiers = Object.keys(exports)
  .filter((path) => !path.endsWith(".json"))
  .map((path) => `airlight${path.slice(1)}`);
const code = (load) => `(async () => {
  const modules = [${specifiers.map((name) => `${load}("${name}")`).join(", ")}];
  const [root, ...rooms] = await Promise.all(modules);
  for (const room of rooms)
    for (const name of Object.keys(room)) if (root[name] !== room[name]) throw new Error(name);
  const air = root.moistAir({ pressurePa: 100000, temperatureK: 293.15, relativeHumidity: 0, co2Ppm: 450 });
  if (root.refractiveIndexCiddor(633, air).toFixed(9) !== "1.000268244") throw new Error("wrong index");
  console.log(process.version);
})()`;

for (const version of VERSIONS)
  for (const load of ["import", "require"]) {
    const node = ["-y", "-p", `node@${version}`, "node", "--no-warnings", "-e", code(load)];
    const { status, stdout, stderr } = spawnSync("npx", node, { cwd, encoding: "utf8" });
    const right = status === 0 && stdout.startsWith(`v${version}.`);
    console.log(`node ${version}, ${load}: ${right ? "ok" : `FAILED\n${stdout}${stderr}`}`);
    if (!right) process.exitCode = 1;
  }
