/** Tables, once for the terminal and once for the report. */

/** A table of texts. */
export interface Table {
  readonly title: string;
  /** Heading and unit of each column ("" for none). */
  readonly columns: readonly (readonly [heading: string, unit: string])[];
  readonly rows: readonly (readonly string[])[];
}

/** The table in fixed-width letters, columns flush right. */
export function tableAsText({ title, columns, rows }: Table): string {
  const lines = [columns.map(([heading]) => heading), columns.map(([, unit]) => unit), ...rows];
  const widths = columns.map((_, c) => Math.max(...lines.map((line) => line[c]!.length)));
  const text = lines.map((line) => line.map((cell, c) => cell.padStart(widths[c]!)).join("  "));
  const rule = widths.map((width) => "-".repeat(width)).join("  ");
  return [title, ...text.slice(0, 2), rule, ...text.slice(2)]
    .map((line) => line.trimEnd())
    .join("\n");
}

/** The table as HTML. */
export function tableAsHtml({ title, columns, rows }: Table): string {
  const head = columns.map(
    ([heading, unit]) =>
      `<th scope="col">${escapeHtml(heading)}<small>${escapeHtml(unit)}</small></th>`,
  );
  const body = rows.map((row) => `<tr>${row.map(cellAsHtml).join("")}</tr>`);
  return `<p class="caption">${escapeHtml(title)}</p>
<div class="table"><table aria-label="${escapeHtml(title)}"><thead><tr>${head.join("")}</tr></thead>
<tbody>
${body.join("\n")}
</tbody></table></div>`;
}

/** `text` with the letters that HTML reserves written out. */
export function escapeHtml(text: string): string {
  const names: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" };
  return text.replace(/[&<>"]/g, (letter) => names[letter]!);
}

/** A cell; a colour such as #ffd2a1 gets a patch of itself. */
function cellAsHtml(text: string): string {
  const patch = /^#[0-9a-f]{6}$/i.test(text)
    ? `<i class="patch" style="background:${text}"></i>`
    : "";
  return `<td>${patch}${escapeHtml(text)}</td>`;
}
