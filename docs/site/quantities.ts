/** The page of quantities, made from the comments of the functions. */
import { publicFunctions } from "./functions.js";
import { SYMBOLS } from "./symbols.js";

const cell = (text: string): string => text.replaceAll("|", "\\|").replaceAll("<", "&lt;") || "-";

/** Markdown of the page. */
export function quantitiesPage(): string {
  const functions = publicFunctions();
  const rooms = [...new Set(functions.map(({ room }) => room))];
  const chapters = rooms.map((room) => {
    const rows = functions
      .filter((one) => one.room === room)
      .map(({ name, meaning, returns, validity, accuracy, source }) => {
        const symbol = SYMBOLS[name] === undefined ? "" : ` $${SYMBOLS[name]}$`;
        const cells = [`${meaning.replace(/\.$/, "")}${symbol}`, `[${name}](#fn-${name})`];
        return `| ${[...cells, ...[returns, validity, accuracy, source].map(cell)].join(" | ")} |`;
      });
    const head = "| quantity | function | gives | range | accuracy measured | source |";
    const table = `${head}\n|---|---|---|---|---|---|\n${rows.join("\n")}`;
    return `## ${room}\n\n<div class="airlight-quantities">\n\n${table}\n\n</div>`;
  });
  return `---
title: Quantities
---

# Quantities

Every public function: what it gives and in which unit, where it may be asked, how far it is from its source as measured by the
tests, and the source. Units of arguments are in their names. The page is made from the comments of the functions.

${chapters.join("\n\n")}
`;
}
