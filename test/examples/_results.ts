/** Runs code blocks against dist. */
import { execFileSync } from "node:child_process";
import { type Block, type BlockResult, resultsOf, writeBlocks } from "./_blocks.js";

/** Runs the blocks in one process, in a folder of .cache (dist and packages resolve from there); what each found wrong, and its picture. */
export function runBlocks(blocks: readonly Block[], folder: string): Record<string, BlockResult> {
  writeBlocks(folder, blocks);
  const options = { encoding: "utf8", maxBuffer: 1e8 } as const;
  return resultsOf(execFileSync(process.execPath, [`${folder}_runBlocks.mjs`], options));
}
