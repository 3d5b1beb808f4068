/** The built pages without a browser: every link and picture leads somewhere, every formula is typeset. */
import { readFileSync } from "node:fs";
import { dirname, join, normalize } from "node:path";
import { parseHTML } from "linkedom";
import { describe, expect, it } from "vitest";
import { allBlocks } from "../examples/_blocks.js";
import { rooms } from "./_rooms.js";
import { pagePaths, SITE } from "./_site.js";

const documents = new Map(
  pagePaths().map((path) => [path, parseHTML(readFileSync(join(SITE, path), "utf8")).document]),
);
const anchors = new Map(
  [...documents].map(([path, document]) => [
    path,
    new Set([...document.querySelectorAll("[id]")].map((element) => element.id)),
  ]),
);

/** What is wrong with a link of a page, if anything. */
function fault(from: string, href: string): string | undefined {
  if (/^(?:https?|mailto|data):/.test(href)) return undefined;
  const [path = "", anchor = ""] = href.split("#");
  const target = path === "" ? from : normalize(join(dirname(from), path));
  const ids = anchors.get(target);
  if (ids === undefined) return `${from}: ${href} leads nowhere`;
  if (anchor === "" || ids.has(decodeURIComponent(anchor))) return undefined;
  return `${from}: ${href} has no such place`;
}

describe("the built site", () => {
  it("has a page per room, the guides, quantities, sources, cautions and the explore page", () => {
    const paths = [...documents.keys()];
    for (const room of rooms) expect(paths).toContain(`modules/${room}.html`);
    for (const path of ["index.html", "explore.html"]) expect(paths).toContain(path);
    const titles = ["Quantities", "Sources", "Cautions", "Predict_a_ground_spectrum"];
    for (const title of titles) expect(paths).toContain(`documents/${title}.html`);
  });

  it("has no broken link", () => {
    const faults = [...documents].flatMap(([path, document]) =>
      [...document.querySelectorAll("a[href]")].flatMap((a) => {
        const href = a.getAttribute("href")!;
        const menu = /^#$/.test(href); // TypeDoc's menu button
        return menu ? [] : (fault(path, href) ?? []);
      }),
    );
    expect(faults).toEqual([]);
    expect(fault("index.html", "nowhere.html")).toBeDefined();
    expect(fault("index.html", "#nowhere")).toBeDefined();
  });

  it("typesets its formulas: no TeX is left in the text", () => {
    const left = [...documents].filter(([, document]) => {
      for (const code of document.querySelectorAll("code, pre, script, annotation")) code.remove();
      return /\$|\\(?:frac|lambda|tau|mathrm)/.test(document.body?.textContent ?? "");
    });
    expect(left.map(([path]) => path)).toEqual([]);
    const formulas = [...documents.values()].flatMap((d) => [...d.querySelectorAll("math")]);
    expect(formulas.length).toBeGreaterThan(30);
  });

  it("describes every picture in words", () => {
    const pictures = [...documents.values()].flatMap((d) => [
      ...d.querySelectorAll("figure.airlight-picture svg"),
    ]);
    const drawn = allBlocks().filter(({ code }) => code.includes('"#picture"'));
    expect(pictures.length).toBe(drawn.length);
    for (const picture of pictures) {
      expect(picture.getAttribute("role")).toBe("img");
      expect(picture.getAttribute("aria-label")?.length).toBeGreaterThan(40);
    }
  });
});
