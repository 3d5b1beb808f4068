/** Texts of a row of elements, written only where they changed: the browser lays out the rest no second time. */

/** Gives `box` one child for each text; `tagOf` names the kind of child at a place. */
export function writeTexts(
  box: HTMLElement,
  texts: readonly string[],
  tagOf: (place: number) => string,
): void {
  while (box.childElementCount > texts.length) box.lastElementChild!.remove();
  for (const [i, text] of texts.entries()) {
    const child = box.children[i] ?? box.appendChild(document.createElement(tagOf(i)));
    if (child.textContent !== text) child.textContent = text;
  }
}
