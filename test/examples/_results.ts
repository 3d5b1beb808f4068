/** Runs code blocks against dist and gathers what each printed wrongly, and the pictures they made. */
import { execFileSync } from "node:child_process";
import { copyFileSync, mkdirSync, rmSync, writeFileSync } from "node:fs";
import { ROOT } from "../_source.js";
import { type Block, executable, plainImports } from "./_blocks.js";

/** What running a block gave. */
export interface BlockResult {
  /** Printed values compared. */
  readonly checked: number;
  /** What was wrong, or thrown. */
  readonly errors: readonly string[];
  /** Markup of the picture the block put into "#picture"; empty if none. */
  readonly picture: string;
}

/** Writes the blocks as modules into a folder of .cache (dist and packages resolve from there), runs them in one process, and returns each one's result by id. */
export function runBlocks(blocks: readonly Block[], folder: string): Record<string, BlockResult> {
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  for (const { id, code } of blocks) {
    let script: string;
    try {
      script = executable(code);
    } catch (error) {
      script = `throw new Error(${JSON.stringify((error as Error).message)});`;
    }
    writeFileSync(`${folder}${id}.mjs`, script);
    // "export {}" makes a module of it
    writeFileSync(`${folder}${id}.ts`, `${plainImports(code)}\nexport {};\n`);
  }
  writeFileSync(`${folder}blocks.json`, JSON.stringify(blocks.map((block) => block.id)));
  for (const file of ["_printed.mjs", "_runBlocks.mjs"])
    copyFileSync(`${ROOT}test/examples/${file}`, folder + file);
  const options = { encoding: "utf8", maxBuffer: 1e8 } as const;
  const output = execFileSync(process.execPath, [`${folder}_runBlocks.mjs`], options);
  return JSON.parse(output.trimEnd().split("\n").at(-1)!);
}
