import { spawn } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import { dirname, join, normalize } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { exportedTypes, exportedValues } from "../house/_rules.js";
import { filesUnder, ROOT, textOf, treeOf } from "../_source.js";
import { PUBLIC_NAMES } from "./_names.js";

const pages = filesUnder(".docs", ".html");

/** Addresses of a page that stay within the documentation, without anchors. */
function localLinks(html: string): string[] {
  return [...html.matchAll(/(?:href|src)="([^"#]+)[^"]*"/g)]
    .map((match) => match[1]!.split("?")[0]!)
    .filter((link) => !/^(?:[a-z]+:|\/\/)/.test(link));
}

describe("the documentation", () => {
  it("has a page for every public name", () => {
    const ground = ["units", "constants"].flatMap((file) => {
      const tree = treeOf(file, textOf(`src/${file}.ts`));
      return [...exportedValues(tree), ...exportedTypes(tree)].map((name) => `${file}.${name}`);
    });
    const rooms = Object.entries(PUBLIC_NAMES).flatMap(([path, { values, types }]) =>
      [...Object.keys(values), ...types].map((name) => `${path.slice(2)}.${name}`),
    );
    const found = new Set(pages.map((page) => page.replace(/^.*\/(.*)\.html$/, "$1")));
    expect([...ground, ...rooms].filter((name) => !found.has(name))).toEqual([]);
  });

  it("has the README for its home, and a favicon", () => {
    const home = textOf(".docs/index.html");
    const title = /^# (.+)$/m.exec(textOf("README.md"))![1]!;
    expect(home).toContain(title);
    expect(home).toMatch(/rel="icon"/);
  });

  it("has no link that leads nowhere", () => {
    expect(pages.length).toBeGreaterThan(20);
    const broken = pages.flatMap((page) =>
      localLinks(readFileSync(ROOT + page, "utf8"))
        .map((link) => normalize(join(dirname(page), decodeURIComponent(link))))
        .filter((target) => !existsSync(ROOT + target))
        .map((target) => `${page} -> ${target}`),
    );
    expect(broken).toEqual([]);
  });
});

describe("its server", () => {
  const child = spawn(process.execPath, [`${ROOT}.config/serveDocs.mjs`, "0"]);
  let address = "";
  beforeAll(async () => {
    address = await new Promise<string>((resolve, reject) => {
      child.stdout.on("data", (data) => resolve(/http:\S+/.exec(String(data))?.[0] ?? ""));
      child.on("close", () => reject(new Error("the server ended")));
    });
  });
  afterAll(() => {
    child.kill();
  });

  it("serves pages, scripts and the favicon with their types", async () => {
    const type = async (path: string): Promise<string | null> => {
      const response = await fetch(address + path);
      expect(response.status, path).toBe(200);
      expect((await response.arrayBuffer()).byteLength).toBeGreaterThan(0);
      return response.headers.get("content-type");
    };
    expect(await type("")).toContain("text/html");
    expect(await type("assets/main.js")).toContain("text/javascript");
    expect(await type("assets/style.css")).toContain("text/css");
    expect(await type("assets/favicon.svg")).toBe("image/svg+xml");
  });

  it("serves nothing else", async () => {
    for (const path of ["nothing.html", "..%2fpackage.json", "%2e%2e/package.json", "%"])
      expect((await fetch(address + path)).status, path).toBe(404);
  });
});
