/** What a search of the site finds, and in which order. */
import {
  type Application,
  type DeclarationReflection,
  IndexEvent,
  type Reflection,
  ReflectionKind,
} from "typedoc";
import type { Block } from "../../test/examples/_blocks.js";

/** How much functions, pages and properties of arguments and results count beside types and constants. */
const FUNCTIONS = 4;
const PAGES = 12;
const PROPERTIES = 0.2;

/** Pages that use a function, beyond which more do not count. */
const MOST_USES = 3;

/** "airMassYoung" as it is and as words, the way people type it. */
export function searchableName(name: string): string {
  return `${name} ${name.replaceAll(/([a-z0-9])([A-Z])/g, "$1 $2")}`;
}

/** The words of a text, without markup, punctuation and numbers: the index of the site mixes up such tokens and then fails. */
export function searchableText(text: string): string {
  const bare = text.replaceAll(/<[^>]*>/g, " ");
  return (bare.match(/\p{L}[\p{L}\d]*/gu) ?? []).join(" ");
}

/** Everything a reader can find a function, a type or a page by, beside its name. */
function textOf(reflection: Reflection): string {
  if (reflection.isDocument()) return reflection.content.map(({ text }) => text).join("\n");
  const signatures = reflection.isDeclaration() ? (reflection.signatures ?? []) : [];
  return [reflection, ...signatures]
    .flatMap(({ comment }) => [
      ...(comment?.summary ?? []),
      ...(comment?.blockTags.flatMap(({ content }) => content) ?? []),
    ])
    .map(({ text }) => text)
    .join("\n");
}

/** How many Markdown pages have code with a word in it. */
export function usesOf(blocks: readonly Block[]): Map<string, number> {
  const pages = new Map<string, Set<string>>();
  for (const { where, code } of blocks) {
    const page = where.split(":")[0]!;
    if (!page.endsWith(".md")) continue;
    const words = pages.get(page) ?? new Set();
    pages.set(page, words);
    for (const word of code.match(/\w+/g) ?? []) words.add(word);
  }
  const uses = new Map<string, number>();
  for (const words of pages.values())
    for (const word of words) uses.set(word, (uses.get(word) ?? 0) + 1);
  return uses;
}

/** Weight of a name: functions before properties, and those more pages use before the others. */
function weightOf({ kind, name }: Reflection, uses: ReadonlyMap<string, number>): number {
  if (kind === ReflectionKind.Function)
    return FUNCTIONS * (1 + Math.min(uses.get(name) ?? 0, MOST_USES));
  if (kind === ReflectionKind.Document) return PAGES;
  return kind === ReflectionKind.Property ? PROPERTIES : 1;
}

/** Hooks the order of results into `app`; `uses` counts the pages whose code calls a function. */
export function attachSearch(app: Application, uses: ReadonlyMap<string, number>): void {
  app.renderer.on(IndexEvent.PREPARE_INDEX, (event) => {
    for (const [i, reflection] of event.searchResults.entries()) {
      event.searchFields[i] = {
        name: searchableText(searchableName(reflection.name)),
        [reflection.isDocument() ? "document" : "comment"]: searchableText(textOf(reflection)),
      };
      (reflection as DeclarationReflection).relevanceBoost = weightOf(reflection, uses);
    }
  });
}
