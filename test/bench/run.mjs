/**
 * Times each kernel of dist beside the naive way of writing it, in one run, and prints the ratios with the target of each.
 * npm run bench               all
 * npm run bench -- beam       only the groups whose name contains the word
 * A ratio is the median over rounds in which both are timed one after the other; below 1 ours is the faster.
 */
import { Bench } from "tinybench";
import { air } from "./air.mjs";
import { beam } from "./beam.mjs";
import { colour } from "./colour.mjs";
import { path } from "./path.mjs";
import { scattering } from "./scattering.mjs";
import { skyCases } from "./sky.mjs";

const ROUNDS = 7;
const MILLISECONDS = 120;

/** Least time of one call, in nanoseconds, of each function of a record. */
async function timesOf(functions, milliseconds) {
  const bench = new Bench({ time: milliseconds, warmupTime: milliseconds / 4, iterations: 3 });
  for (const [name, run] of Object.entries(functions)) bench.add(name, () => void run());
  await bench.run();
  return bench.tasks.map((task) => {
    if (task.result.state !== "completed") throw task.result.error ?? new Error(task.name);
    return task.result.latency.min * 1e6;
  });
}

const median = (values) => [...values].sort((a, b) => a - b)[values.length >> 1];

const wanted = process.argv.slice(2);
const groups = { scattering, air, path, beam, sky: skyCases, colour };
for (const [name, cases] of Object.entries(groups)) {
  if (wanted.length > 0 && !wanted.some((word) => name.includes(word))) continue;
  console.log(name);
  for (const { title, beside, count, ours, naive, target } of cases) {
    const [a, b] = [ours(), naive()];
    if (!(Math.abs(a - b) <= 1e-6 * Math.abs(b))) throw new Error(`${title}: ${a} is not ${b}`);
    const rounds = [];
    for (let i = 0; i < ROUNDS; i++) rounds.push(await timesOf({ ours, naive }, MILLISECONDS));
    const ratios = rounds.map(([mine, theirs]) => mine / theirs);
    const [low, high] = [Math.min(...ratios), Math.max(...ratios)];
    const each = median(rounds.map(([mine]) => mine)) / count;
    const goal =
      target === undefined ? "" : `target ${target} ${median(ratios) <= target ? "met" : "MISSED"}`;
    console.log(
      `  ${title.padEnd(44)} ${each.toFixed(2).padStart(8)} ns each, ${median(ratios).toFixed(2)} of ${beside} (${low.toFixed(2)} to ${high.toFixed(2)})  ${goal}`,
    );
  }
}
