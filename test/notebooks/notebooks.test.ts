/** The notebooks, executed from their first cell to their last in a Deno kernel; what they claim is compared with what came out. */
import { execFileSync } from "node:child_process";
import { mkdirSync, readFileSync, rmSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { NBCONVERT, REQUIRE_ALL } from "../_installed.js";
import { filesUnder, ROOT } from "../_source.js";
// @ts-expect-error plain JavaScript, shared with a script
import { difference, parsePrinted } from "../examples/_printed.mjs";

interface Output {
  readonly output_type: string;
  readonly data?: Readonly<Record<string, string | readonly string[]>>;
}
interface Cell {
  readonly cell_type: "code" | "markdown";
  readonly source: string | readonly string[];
  readonly outputs?: readonly Output[];
}

const FOLDER = `${ROOT}examples/notebooks`;
const OUT = `${ROOT}.cache/notebooks`;
const paths = filesUnder("examples/notebooks", ".ipynb", false);
const textOf = (lines: string | readonly string[] = ""): string =>
  typeof lines === "string" ? lines : lines.join("");

/** Executes a notebook and returns its cells; throws if a cell does. */
function execute(path: string): Cell[] {
  mkdirSync(OUT, { recursive: true });
  const name = path.split("/").at(-1)!;
  rmSync(`${OUT}/${name}`, { force: true });
  const kernel = "--ExecutePreprocessor.kernel_name=deno";
  execFileSync(
    NBCONVERT!,
    ["--to", "notebook", "--execute", kernel, "--output-dir", OUT, `${FOLDER}/${name}`],
    {
      cwd: FOLDER,
      encoding: "utf8",
      stdio: ["ignore", "pipe", "pipe"],
      env: { ...process.env, JUPYTER_PATH: FOLDER, DENO_NO_UPDATE_CHECK: "1" },
    },
  );
  return JSON.parse(readFileSync(`${OUT}/${name}`, "utf8")).cells;
}

const resultOf = ({ outputs = [] }: Cell): Output | undefined =>
  outputs.find((one) => one.output_type === "execute_result");
const claimOf = ({ source }: Cell): string | undefined => /\/\/ => (.+)$/.exec(textOf(source))?.[1];
const draws = ({ source }: Cell): boolean => textOf(source).includes("Plot.plot(");

/** Results cell by cell. On a busy machine the client can miss a result that comes after the kernel's "idle": those are taken from another run. */
function resultsOf(path: string): [Cell, Output | undefined][] {
  let executed = execute(path);
  for (let again = 0; again < 4; again++) {
    const missing = executed.some(
      (cell) => (claimOf(cell) !== undefined || draws(cell)) && resultOf(cell) === undefined,
    );
    if (!missing) break;
    const next = execute(path);
    executed = executed.map((cell, i) => (resultOf(cell) === undefined ? next[i]! : cell));
  }
  return executed.map((cell) => [cell, resultOf(cell)]);
}

/** A number, or list of numbers and strings, as the kernel prints it in colour. */
function printedValue({ data }: Output): unknown {
  // biome-ignore lint/suspicious/noControlCharactersInRegex: the escape sequences are what is taken out
  const text = textOf(data?.["text/plain"]).replace(/\u001b\[\d+m/g, "");
  return JSON.parse(text.replace(/\bNaN\b/g, "null").replace(/,?\s*\]/g, "]"));
}

it("has Jupyter, where nothing may be skipped", () => {
  expect(paths.length).toBeGreaterThan(1);
  if (REQUIRE_ALL) expect(NBCONVERT).toBeDefined();
});

describe.each(paths)("%s", (path) => {
  const cells: Cell[] = JSON.parse(readFileSync(ROOT + path, "utf8")).cells;

  it("is committed without outputs, says what it is about and what follows", () => {
    const notes = cells.filter((cell) => cell.cell_type === "markdown");
    expect(textOf(notes[0]?.source)).toMatch(/^# /);
    expect(textOf(notes.at(-1)?.source)).toMatch(/^\*\*Conclusion\.\*\*/);
    for (const { outputs = [] } of cells) expect(outputs).toEqual([]);
  });

  it.skipIf(NBCONVERT === undefined)("runs, and gives what it claims, with a picture", () => {
    let claims = 0;
    let pictures = 0;
    for (const [cell, result] of resultsOf(path)) {
      if (draws(cell))
        expect(textOf(result?.data?.["image/svg+xml"])).toMatch(/aria-label="[^"]{40,}/);
      pictures += draws(cell) ? 1 : 0;
      const claim = claimOf(cell);
      if (claim === undefined) continue;
      expect(result, textOf(cell.source)).toBeDefined();
      expect(difference(parsePrinted(claim), printedValue(result!))).toBeUndefined();
      claims += 1;
    }
    expect(claims).toBeGreaterThan(1);
    expect(pictures).toBeGreaterThan(0);
  });
});
