/** What the site adds to TypeDoc: chapters of the rooms, links to functions by name, formulas, a link to the explore page. */
import { existsSync, readFileSync } from "node:fs";
import {
  type Application,
  Converter,
  type DeclarationReflection,
  JSX,
  PageEvent,
  ReflectionKind,
} from "typedoc";
import { ROOT } from "../../test/_source.js";

/** Text a chapter starts with, from docs/rooms. */
function chapterOf(room: string): string | undefined {
  const path = `${ROOT}docs/rooms/${room}.md`;
  return existsSync(path)
    ? readFileSync(path, "utf8").replaceAll(/\$\$?[^$]+\$\$?/g, (tex) =>
        tex.replaceAll("{@", "{ @"),
      )
    : undefined;
}

/** Hooks the additions into `app`. */
export function attachSite(app: Application): void {
  const pages = new Map<string, string>();
  app.converter.on(Converter.EVENT_RESOLVE_BEGIN, (context) => {
    for (const module of context.project.getReflectionsByKind(ReflectionKind.Module)) {
      const text = chapterOf(module.name);
      if (text !== undefined) module.comment?.summary.push({ kind: "text", text: `\n\n${text}` });
      for (const child of (module as DeclarationReflection).children ?? []) {
        const folder = child.kind === ReflectionKind.Function ? "functions" : "variables";
        pages.set(child.name, `${folder}/${module.name}.${child.name}.html`);
      }
    }
  });
  app.renderer.on(PageEvent.END, (page) => {
    const up = "../".repeat(page.url.split("/").length - 1);
    page.contents = (page.contents ?? "")
      .replace(/href="#fn-(\w+)"/g, (_, name) => {
        const target = pages.get(name);
        if (target === undefined) throw new Error(`${page.url}: there is no function ${name}`);
        return `href="${up}${target}"`;
      })
      .replaceAll('href="#explore-page"', `href="${up}explore.html"`);
  });
  app.renderer.hooks.on("sidebar.begin", (context) =>
    JSX.createElement(
      "p",
      { class: "airlight-explore" },
      JSX.createElement(
        "a",
        { href: context.relativeURL("explore.html") ?? "" },
        "Explore with sliders",
      ),
    ),
  );
}
