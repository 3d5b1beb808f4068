/** The page of sources, gathered from the comments of the functions. */
import { textOf } from "../../test/_source.js";
import { publicFunctions } from "./functions.js";

/** Works named in a Source section: it separates them by semicolons. */
function worksOf(source: string): string[] {
  return source
    .replace(/\(([^)]*)\)/g, (all) => all.replaceAll(";", ","))
    .split(/;\s+/)
    .map((work) => work.trim().replace(/\.$/, ""))
    .filter((work) => /\b(1[89]|20)\d\d\b|\bCIE\b|\bISO\b|\bIEC\b/.test(work));
}

/** Markdown of the page. */
export function sourcesPage(): string {
  const users = new Map<string, string[]>();
  for (const { name, source } of publicFunctions())
    for (const work of worksOf(source)) users.set(work, [...(users.get(work) ?? []), name]);
  const rows = [...users]
    .sort(([a], [b]) => a.localeCompare(b, "en"))
    .map(
      ([work, names]) =>
        `| ${work.replaceAll("|", "\\|")} | ${names.map((n) => `[${n}](#fn-${n})`).join(", ")} |`,
    );
  return `${textOf("docs/sources.md").trimEnd()}

## Works, and the functions that follow them

| work | functions |
|---|---|
${rows.join("\n")}
`;
}
