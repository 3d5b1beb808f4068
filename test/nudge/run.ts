/**
 * Changes each numeric literal of the formulas a little, one at a time, runs the tests of its room, and lists the changes no test noticed.
 * npm run nudge                    every room
 * npm run nudge -- air path        only these; a file of src can be named too
 * npm run nudge -- --guards air    the limits given to guards as well
 * npm run nudge -- --explained     the changes explained in equivalent/ instead, to see which of them a test notices after all
 * Exit code 1 if a change of 0.1 % (or of a whole step, for what counts) goes unnoticed and is not explained in equivalent/.
 */
import { fork } from "node:child_process";
import { existsSync } from "node:fs";
import { cpus } from "node:os";
import { filesUnder, ROOT } from "../_source.js";
import { ROOMS } from "../house/_rules.js";
import { EQUIVALENT, type Equivalent } from "./equivalent/index.js";
import { type Nudge, nudgesOf } from "./_literals.js";
import type { Job, Report } from "./_worker.js";

/** Until a room's tests have passed unchanged. */
const MOST_SECONDS_BEFORE = 600;
/** A change whose tests take this long, and so many times as long as unchanged, is taken for endless, and so for noticed. */
const MOST_SECONDS = 60;
const MOST_TIMES = 6;

interface Outcome {
  readonly nudge: Nudge;
  readonly noticed: number;
}

/** Rooms whose tests do not pass as they are. */
const unusable: string[] = [];

/** Runs a job in a process of its own; a hung literal ends the process, and another goes on after it. */
async function runJob(room: string, { tests, nudges }: Job): Promise<Outcome[]> {
  const outcomes: Outcome[] = [];
  while (outcomes.length < nudges.length) {
    const worker = fork(`${ROOT}test/nudge/_worker.ts`);
    let timer: NodeJS.Timeout | undefined;
    let limit = MOST_SECONDS_BEFORE;
    let broken = "the tests take too long";
    const wind = (): void => {
      clearTimeout(timer);
      timer = setTimeout(() => worker.kill("SIGKILL"), limit * 1000);
    };
    worker.on("message", (report: Report) => {
      const nudge = nudges[outcomes.length];
      if (report.readySeconds !== undefined) {
        broken = "";
        limit = Math.max(MOST_SECONDS, MOST_TIMES * report.readySeconds);
      }
      if (report.broken !== undefined) broken = report.broken;
      if (report.noticed !== undefined && nudge) outcomes.push({ nudge, noticed: report.noticed });
      if (report.noticed === -1 && nudge) console.error(`not noticed: ${lineOf(nudge, -1)}`);
      wind();
    });
    wind();
    worker.send({ tests, nudges: nudges.slice(outcomes.length) } satisfies Job);
    const code = await new Promise<number | null>((resolve) => worker.on("close", resolve));
    clearTimeout(timer);
    if (broken !== "") {
      console.error(`${room} cannot be tried: ${broken}`);
      unusable.push(`${room}: ${broken}`);
      return [];
    }
    if (code === 0) break;
    // the change made a test run forever, or brought the process down
    console.error(`ended the tests: ${lineOf(nudges[outcomes.length]!, 0)}`);
    outcomes.push({ nudge: nudges[outcomes.length]!, noticed: 0 });
  }
  return outcomes;
}

/** The jobs for a room, or those of its files that are named, shared out so that every processor has something to do. */
function jobsOf(room: string, shares: number): { room: string; job: Job }[] {
  const tests = existsSync(`${ROOT}test/${room}`) ? filesUnder(`test/${room}`, ".test.ts") : [];
  const files = filesUnder(`src/${room}`, ".ts").filter((path) => isWanted(room) || isWanted(path));
  const all = files.flatMap((path) => nudgesOf(path, args.includes("--guards")));
  const explained = all.filter((nudge) => reason(nudge) !== undefined);
  const nudges = args.includes("--explained")
    ? explained
    : all.filter((n) => !explained.includes(n));
  skipped += all.length - nudges.length;
  const size = Math.max(12, Math.ceil(nudges.length / shares));
  const starts = nudges.flatMap((_, i) => (i % size === 0 ? [i] : []));
  return starts.map((i) => ({ room, job: { tests, nudges: nudges.slice(i, i + size) } }));
}

/** True of a room or file that is named, and of everything if nothing is. */
function isWanted(name: string): boolean {
  return named.length === 0 || named.includes(name);
}

/** Why a change is right to go unnoticed, if somebody has said so. */
function reason({ path, source, text }: Nudge): Equivalent | undefined {
  const found = EQUIVALENT.find(
    (e) => e.path === path && source.includes(e.line) && e.literals.includes(text),
  );
  if (found !== undefined) used.add(found);
  return found;
}

const args = process.argv.slice(2);
const named = args.filter((arg) => !arg.startsWith("--"));
const used = new Set<Equivalent>();
let skipped = 0;
const processes = Math.max(1, Math.min(4, cpus().length));
const queue = ROOMS.flatMap((room) => jobsOf(room, processes));
const outcomes: Outcome[] = [];
await Promise.all(
  Array.from({ length: processes }, async () => {
    for (let next = queue.shift(); next !== undefined; next = queue.shift())
      outcomes.push(...(await runJob(next.room, next.job)));
  }),
);

/** A change in words: its finer or its coarser value. */
function lineOf({ path, line, text, changed, source }: Nudge, which: 0 | -1): string {
  return `${path}:${line}: ${text} -> ${changed.at(which)}   ${source}`;
}

function list(title: string, some: readonly Outcome[], which: 0 | -1): void {
  if (some.length > 0) console.log(title);
  for (const { nudge } of some) console.log(`  ${lineOf(nudge, which)}`);
}
const unnoticed = outcomes.filter((o) => o.noticed < 0);
const blunt = outcomes.filter((o) => o.noticed > 0);
const stale = named.length > 0 ? [] : EQUIVALENT.filter((e) => !used.has(e));
for (const { path, line } of stale)
  console.log(`Explained, but there is no such literal: ${path}: ${line}`);
if (args.includes("--explained")) {
  list(
    "Noticed after all:",
    outcomes.filter((o) => o.noticed >= 0),
    0,
  );
} else {
  list("Noticed at 0.1 %, not at one unit of the last digit:", blunt, 0);
  list("Not noticed:", unnoticed, -1);
  console.log(
    `${outcomes.length} literals changed: ${unnoticed.length} not noticed, ${blunt.length} noticed only at 0.1 %; ${skipped} more explained`,
  );
  if (outcomes.length === 0 || unnoticed.length > 0) process.exitCode = 1;
}
for (const room of new Set(unusable)) console.log(`Not tried, the tests fail unchanged: ${room}`);
if (unusable.length > 0 || stale.length > 0) process.exitCode = 1;
