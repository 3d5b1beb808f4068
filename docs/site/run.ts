/** In the page: puts a Run button under every block that can run, executes it against the built library and shows its values. */
// @ts-expect-error plain JavaScript, shared with the tests
import { difference, parsePrinted } from "../../test/examples/_printed.mjs";

declare const SCRIPTS: Record<string, string>;

interface Page {
  airlightModules?: Record<string, string>;
  checkPrinted?: (line: number, text: string, value: unknown) => unknown;
}

const page = globalThis as unknown as Page;
const assets = new URL(".", (document.currentScript as HTMLScriptElement).src).href;
const urls = new Map<string, Promise<string>>();

/** Object URL of a package's module; its source comes from a classic script, which also works from disk. */
function moduleUrl(name: string): Promise<string> {
  const known = urls.get(name);
  if (known !== undefined) return known;
  const loading = new Promise<string>((resolve, reject) => {
    const script = document.createElement("script");
    script.src = `${assets}modules/${name.replace(/[^\w-]+/g, "-")}.js`;
    script.onload = () => resolve(objectUrl(page.airlightModules?.[name] ?? ""));
    script.onerror = () => reject(new Error(`${name} did not load`));
    document.head.append(script);
  });
  urls.set(name, loading);
  return loading;
}

const objectUrl = (source: string): string =>
  URL.createObjectURL(new Blob([source], { type: "text/javascript" }));

/** The script with its packages replaced by object URLs. */
async function linked(script: string): Promise<string> {
  const specifier = /^(\s*import\b[^;]*?["'])([^"']+)(["'])/gm;
  const names = [...script.matchAll(specifier)].map((match) => match[2]!);
  const ours = (name: string): string => (name.startsWith("airlight/") ? "airlight" : name);
  const found = new Map<string, string>();
  for (const name of names) found.set(name, await moduleUrl(ours(name)));
  return script.replace(specifier, (_, before, name, after) => before + found.get(name) + after);
}

/** A value as text: numbers with up to 10 digits, long lists cut. */
function show(value: unknown): string {
  if (typeof value === "number") return String(Number(value.toPrecision(10)));
  if (typeof value === "string") return `"${value}"`;
  if (typeof value !== "object" || value === null) return String(value);
  if (ArrayBuffer.isView(value) || Array.isArray(value)) {
    const list = Array.from(value as unknown as ArrayLike<unknown>);
    const rest = list.length > 8 ? `, ... ${list.length} in all` : "";
    return `[${list.slice(0, 8).map(show).join(", ")}${rest}]`;
  }
  return `{ ${Object.entries(value)
    .map(([key, field]) => `${key}: ${show(field)}`)
    .join(", ")} }`;
}

function line(output: HTMLElement, text: string, kind = ""): HTMLElement {
  const row = document.createElement("div");
  row.className = kind;
  row.textContent = text;
  output.append(row);
  return row;
}

/** Runs a script and fills the output. */
async function run(code: string, script: string, output: HTMLElement): Promise<void> {
  output.replaceChildren();
  document.querySelector("#picture")?.removeAttribute("id");
  const picture = document.createElement("div");
  picture.id = "picture";
  const lines = code.split("\n");
  page.checkPrinted = (at, text, value) => {
    const expression = (lines[at - 1] ?? "").replace(/;?\s*\/\/.*$/, "").trim();
    const swatch = line(output, `${expression}  →  ${show(value)}`);
    const wrong = difference(parsePrinted(text), value);
    if (wrong !== undefined) line(output, `the comment says ${text}`, "error");
    if (typeof value === "string" && /^#[0-9a-f]{6}$/i.test(value)) {
      const sample = document.createElement("span");
      sample.className = "swatch";
      sample.style.backgroundColor = value;
      swatch.append(" ", sample);
    }
    return value;
  };
  output.append(picture);
  try {
    await import(objectUrl(await linked(script)));
    output.append(picture);
    if (output.children.length === 1 && picture.childElementCount === 0)
      line(output, "done: nothing to show");
  } catch (error) {
    line(output, String(error), "error");
  }
}

/** The code of a block: TypeDoc ends its lines with <br>. */
function codeOf(block: HTMLElement): string {
  const copy = block.cloneNode(true) as HTMLElement;
  for (const end of copy.querySelectorAll("br")) end.replaceWith("\n");
  return (copy.textContent ?? "").trim();
}

/** Puts the button under a block. */
function addButton(block: HTMLElement): void {
  const code = codeOf(block);
  const script = SCRIPTS[code];
  if (script === undefined || block.parentElement === null) return;
  const bar = document.createElement("div");
  bar.className = "airlight-run";
  const button = document.createElement("button");
  button.type = "button";
  button.textContent = "Run";
  button.setAttribute("aria-label", "Run the code block above");
  const output = document.createElement("output");
  output.setAttribute("aria-live", "polite");
  button.addEventListener("click", async () => {
    button.disabled = true;
    await run(code, script, output);
    button.disabled = false;
    bar.dataset.ran = String(Number(bar.dataset.ran ?? 0) + 1);
  });
  bar.append(button, output);
  block.parentElement.after(bar);
}

for (const block of document.querySelectorAll<HTMLElement>("pre > code")) addButton(block);
