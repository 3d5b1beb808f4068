/** The Markdown pages as TypeDoc gets them: with the pictures their blocks make. */
import { mkdirSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";
import { type Block, type BlockResult, markdownBlocks } from "../../test/examples/_blocks.js";
import { filesUnder, textOf } from "../../test/_source.js";

/** Blocks of all pages under docs. */
export function pageBlocks(): Block[] {
  return filesUnder("docs", ".md").flatMap((path) => markdownBlocks(path, textOf(path)));
}

/** A picture as a figure that stands in a page: one line, so that Markdown leaves it alone. */
function figure(picture: string): string {
  const svg = picture.replace(/\s*\n\s*/g, " ").replace("<svg ", '<svg role="img" ');
  return `<figure class="airlight-picture">${svg}</figure>`;
}

/** Where a page wants its picture instead. */
const PLACE = "<!-- picture -->";

/** The text of a page with a picture after each block that makes one. */
export function withPictures(path: string, results: Record<string, BlockResult>): string {
  let text = textOf(path);
  for (const { id, code } of markdownBlocks(path, text)) {
    const { picture = "", errors = [] } = results[id] ?? {};
    if (errors.length > 0) throw new Error(`${path}: ${errors.join("; ")}`);
    if (picture === "") continue;
    if (text.includes(PLACE)) {
      text = text.replace(PLACE, figure(picture));
      continue;
    }
    const end = text.indexOf("\n```", text.indexOf(code)) + 4;
    text = `${text.slice(0, end)}\n\n${figure(picture)}\n${text.slice(end)}`;
  }
  return text;
}

/** Writes a text, making its folder. */
export function writePage(path: string, text: string): void {
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, text);
}
