/** Runs the tests of one room once per changed literal; the parent ends the process when a change makes a test run forever. */
import * as vitestExpect from "@vitest/expect";
import "../_seed.js";
import { bundleTests, type Register } from "./_bundle.js";
import type { Nudge } from "./_literals.js";

/** From the parent: which tests, which literals, and at which to start. */
export interface Job {
  readonly tests: readonly string[];
  readonly nudges: readonly Nudge[];
}
/** To the parent: first `readySeconds`, then one `noticed` per literal. */
export interface Report {
  /** How long the tests took unchanged. */
  readonly readySeconds?: number;
  /** Position in `changed` of the change a test noticed; -1 if none did. */
  readonly noticed?: number;
  /** Why the tests cannot be used: they do not build, or fail unchanged. */
  readonly broken?: string;
}

interface Test {
  readonly name: string;
  readonly run: () => unknown;
}

const { chai, JestAsymmetricMatchers, JestChaiExpect, JestExtend } = vitestExpect;
for (const plugin of [JestExtend, JestChaiExpect, JestAsymmetricMatchers]) chai.use(plugin);

/** The tests a bundle registers. */
function collect(register: Register, changed: number, value: number): Test[] {
  const tests: Test[] = [];
  const it = (name: string, run: () => unknown): void => void tests.push({ name, run });
  const each =
    (add: (name: string, run: () => unknown) => void) =>
    (rows: readonly unknown[]) =>
    (name: string, run: (...row: unknown[]) => unknown): void => {
      for (const row of rows) add(name, () => (Array.isArray(row) ? run(...row) : run(row)));
    };
  const describe = (_name: string, body: () => void): void => body();
  const api = Object.assign(it, { each: each(it) });
  const group = Object.assign(describe, {
    each: each((_name, body) => void body()),
  });
  register({ describe: group, it: api, test: api, expect: chai.expect }, changed, value);
  return tests;
}

/** Position and name of the first test that fails, trying `order` first; undefined if all pass. */
async function firstFailure(
  tests: readonly Test[],
  order: readonly number[],
): Promise<number | undefined> {
  for (const i of order) {
    try {
      await tests[i]!.run();
    } catch {
      return i;
    }
  }
  return undefined;
}

/** Positions of the tests, quickest first. */
async function byTime(tests: readonly Test[]): Promise<number[]> {
  const times: number[] = [];
  for (const { name, run } of tests) {
    const start = performance.now();
    try {
      await run();
    } catch (error) {
      throw new Error(`"${name}" fails unchanged: ${String(error).split("\n")[0]}`);
    }
    times.push(performance.now() - start);
  }
  return times.map((_, i) => i).sort((a, b) => times[a]! - times[b]!);
}

/** Whether a test notices literal `n` at `value`; a test that does is tried first the next time. */
async function notices(
  register: Register,
  n: number,
  value: number,
  order: number[],
): Promise<boolean> {
  let tests: Test[];
  try {
    tests = collect(register, n, value);
  } catch {
    return true; // the test files themselves do not load
  }
  const failed = await firstFailure(tests, order);
  if (failed !== undefined) order.unshift(...order.splice(order.indexOf(failed), 1));
  return failed !== undefined || tests.length !== order.length;
}

const tell = (report: Report): Promise<void> =>
  new Promise((resolve) => process.send!(report, () => resolve()));

async function work({ tests, nudges }: Job): Promise<void> {
  const register = await bundleTests(tests, nudges);
  const start = performance.now();
  const order = await byTime(collect(register, -1, 0));
  await tell({ readySeconds: (performance.now() - start) / 1000 });
  if (order.length === 0) throw new Error("no tests");
  for (const [n, { changed }] of nudges.entries()) {
    let noticed = -1;
    for (let i = 0; i < changed.length && noticed < 0; i++)
      if (await notices(register, n, Number(changed[i]), order)) noticed = i;
    await tell({ noticed });
  }
}

process.on("message", async (job: Job) => {
  try {
    await work(job);
  } catch (error) {
    await tell({ broken: String((error as Error).message) });
  }
  process.exit(0);
});
